import { chakra } from '@chakra-ui/react';
import { Button } from '../../components/button';
import { FormRefusal } from '../../components/form-refusal';
import { RuledTable } from '../../components/ruled-table';
import { momentWords } from '../../wording/date-words';
import { useSignOut } from '../auth/requests/sign-out';
import { browserWords } from './browser-words';
import { type OwnSession, useEndOwnSession } from './requests/own-sessions';

/** Where one is signed in; any of them can be ended from here. */
export function SessionList({ sessions }: { sessions: readonly OwnSession[] }) {
  const end = useEndOwnSession();
  const signOut = useSignOut();
  const error = end.error ?? signOut.error;
  return (
    <>
      {error !== null && <FormRefusal error={error} />}
      <RuledTable label="Where you are signed in">
        <thead>
          <tr>
            <th scope="col">Browser</th>
            <th scope="col">Address</th>
            <th scope="col">Since</th>
            <th scope="col">Last used</th>
            <th scope="col">
              <chakra.span srOnly>End it</chakra.span>
            </th>
          </tr>
        </thead>
        <tbody>
          {sessions.map((session) => (
            <tr key={session.id}>
              <th scope="row" title={session.userAgent}>
                {browserWords(session.userAgent)}
              </th>
              <td>{session.address}</td>
              <td>{momentWords(session.createdAt)}</td>
              <td>{momentWords(session.lastUsedAt)}</td>
              <td data-number>
                {session.current ? (
                  <chakra.span color="fg.muted">this one</chakra.span>
                ) : (
                  <Button
                    variant="plain"
                    disabled={end.isPending && end.variables === session.id}
                    aria-label={`End ${browserWords(session.userAgent)}, last used ${momentWords(session.lastUsedAt)}`}
                    onClick={() => end.mutate(session.id)}
                  >
                    End it
                  </Button>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </RuledTable>
      <Button mt={4} disabled={signOut.isPending} onClick={() => signOut.mutate('everywhere')}>
        Sign out everywhere
      </Button>
    </>
  );
}
