import { Answered } from '../../components/answered';
import { Page } from '../../components/page';
import { Section } from '../../components/section';
import { InvitationTable } from './invitation-table';
import { InviteForm } from './invite-form';
import { useInvitations } from './requests/invitations';
import { useUsers } from './requests/list-users';
import { UserTable } from './user-table';

/** Who has an account, who is invited, and in what roles. */
export function Component() {
  const users = useUsers();
  const invitations = useInvitations();
  return (
    <Page title="People" lead="Everybody who has an account, and what he or she may do with it.">
      <Answered query={users} label="Reading the accounts" lines={10}>
        {(people) => (
          <>
            <UserTable users={people} />
            <Section title="Invite somebody" lead="A link to open the account goes to this address.">
              <InviteForm />
            </Section>
            <Section title="Open invitations">
              <Answered query={invitations} label="Reading the invitations" lines={3}>
                {(items) => <InvitationTable invitations={items} />}
              </Answered>
            </Section>
          </>
        )}
      </Answered>
    </Page>
  );
}
