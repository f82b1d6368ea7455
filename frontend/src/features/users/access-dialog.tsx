import { ConfirmWithReason } from '../../components/confirm-with-reason';
import { useChangeUser } from './requests/change-user';
import type { UserDetails } from './requests/list-users';

/** Keeps a person out, or lets him or her back in, with the reason. */
export function AccessDialog({ user, onClose }: { user: UserDetails; onClose: () => void }) {
  const change = useChangeUser();
  const isOut = user.state === 'deactivated';
  return (
    <ConfirmWithReason
      title={isOut ? `Let ${user.name} back in` : `Keep ${user.name} out`}
      description={
        isOut
          ? 'The account works again, with the roles it had.'
          : 'All sign-ins of this person end at once. What he or she has done stays.'
      }
      act={isOut ? 'Let back in' : 'Keep out'}
      initialValues={{}}
      error={change.error}
      onConfirm={({ reason }) =>
        change.mutateAsync({
          id: user.id,
          change: isOut ? 'reactivate' : 'deactivate',
          body: { reason, version: user.version },
        })
      }
      onClose={onClose}
    />
  );
}
