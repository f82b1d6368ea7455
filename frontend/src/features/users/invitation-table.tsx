import { chakra } from '@chakra-ui/react';
import { Button } from '../../components/button';
import { FormRefusal } from '../../components/form-refusal';
import { RuledTable } from '../../components/ruled-table';
import { dayWords } from '../../wording/date-words';
import { roleWords } from '../../wording/role-words';
import { type Invitation, useWithdrawInvitation } from './requests/invitations';

/** Invitations that nobody has followed yet. */
export function InvitationTable({ invitations }: { invitations: readonly Invitation[] }) {
  const withdraw = useWithdrawInvitation();
  if (invitations.length === 0) return <p className="not-stated">Every invitation has been followed.</p>;
  return (
    <>
      {withdraw.isError && <FormRefusal error={withdraw.error} />}
      <RuledTable label="Open invitations">
        <thead>
          <tr>
            <th scope="col">E-mail</th>
            <th scope="col">Roles</th>
            <th scope="col">Invited by</th>
            <th scope="col">Good until</th>
            <th scope="col">
              <chakra.span srOnly>Take back</chakra.span>
            </th>
          </tr>
        </thead>
        <tbody>
          {invitations.map((invitation) => (
            <tr key={invitation.id}>
              <th scope="row">{invitation.email}</th>
              <td>{invitation.roles.map((role) => roleWords[role]).join(', ')}</td>
              <td>{invitation.invitedBy}</td>
              <td>
                {dayWords(invitation.expiresAt)}
                {invitation.state === 'expired' && <chakra.b color="unmet"> expired</chakra.b>}
              </td>
              <td data-number>
                <Button
                  variant="plain"
                  aria-label={`Take the invitation of ${invitation.email} back`}
                  disabled={withdraw.isPending && withdraw.variables === invitation.id}
                  onClick={() => withdraw.mutate(invitation.id)}
                >
                  Take back
                </Button>
              </td>
            </tr>
          ))}
        </tbody>
      </RuledTable>
    </>
  );
}
