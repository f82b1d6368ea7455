import { chakra } from '@chakra-ui/react';
import { useUser } from '../../api/ability';
import { Answered } from '../../components/answered';
import { Page } from '../../components/page';
import { Section } from '../../components/section';
import { ThemeChoice } from '../../shell/theme-choice';
import { roleWords } from '../../wording/role-words';
import { NameForm } from './name-form';
import { PasswordForm } from './password-form';
import { useOwnSessions } from './requests/own-sessions';
import { SessionList } from './session-list';

/** What everybody keeps for oneself: name, password, sign-ins and appearance. */
export function Component() {
  const user = useUser();
  const sessions = useOwnSessions();
  if (user === undefined) return null;
  return (
    <Page title="Own account" lead={`${user.email}, ${user.roles.map((role) => roleWords[role]).join(', ')}`}>
      <Section title="Name" lead="Colleagues see it beside everything you do.">
        <NameForm name={user.name} />
      </Section>
      <Section title="Password" lead="Changing it ends every other sign-in of yours.">
        <PasswordForm />
      </Section>
      <Section title="Sign-ins" lead="End what you do not recognise, then change the password.">
        <Answered query={sessions} label="Reading the sign-ins" lines={3}>
          {(items) => <SessionList sessions={items} />}
        </Answered>
      </Section>
      <Section title="Appearance" lead="Kept in this browser.">
        <chakra.div marginInlineStart={-3}>
          <ThemeChoice />
        </chakra.div>
      </Section>
    </Page>
  );
}
