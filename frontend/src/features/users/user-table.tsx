import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { useUser } from '../../api/ability';
import { Button } from '../../components/button';
import { RuledTable } from '../../components/ruled-table';
import { dayWords } from '../../wording/date-words';
import { roleWords } from '../../wording/role-words';
import { AccessDialog } from './access-dialog';
import type { UserDetails } from './requests/list-users';
import { RolesDialog } from './roles-dialog';

type Asked = { what: 'roles' | 'access'; user: UserDetails };

/** Everybody who has an account, and what can be changed of it. */
export function UserTable({ users }: { users: readonly UserDetails[] }) {
  const [asked, setAsked] = useState<Asked>();
  const self = useUser();
  // One that is late to close must not take the next one along.
  const close = (): void => setAsked((now) => (now === asked ? undefined : now));
  return (
    <>
      <RuledTable label="People">
        <thead>
          <tr>
            <th scope="col">Name</th>
            <th scope="col">Roles</th>
            <th scope="col">Account</th>
            <th scope="col">Last seen</th>
            <th scope="col">
              <chakra.span srOnly>Change</chakra.span>
            </th>
          </tr>
        </thead>
        <tbody>
          {users.map((user) => (
            <tr key={user.id}>
              <th scope="row">
                {user.name}
                <chakra.span display="block" fontWeight="normal" color="fg.muted">
                  {user.email}
                </chakra.span>
              </th>
              <td>{user.roles.map((role) => roleWords[role]).join(', ')}</td>
              <td>{user.state === 'active' ? 'active' : <chakra.b color="caution">kept out</chakra.b>}</td>
              <chakra.td whiteSpace="nowrap">
                {user.lastSeenAt === undefined ? (
                  <span className="not-stated">never</span>
                ) : (
                  dayWords(user.lastSeenAt)
                )}
              </chakra.td>
              <td data-number>
                <Button
                  variant="plain"
                  aria-label={`Change the roles of ${user.name}`}
                  onClick={() => setAsked({ what: 'roles', user })}
                >
                  Roles
                </Button>
                {user.id !== self?.id && (
                  <Button
                    variant="plain"
                    ms={4}
                    aria-label={
                      user.state === 'active' ? `Keep ${user.name} out` : `Let ${user.name} back in`
                    }
                    onClick={() => setAsked({ what: 'access', user })}
                  >
                    {user.state === 'active' ? 'Keep out' : 'Let back in'}
                  </Button>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </RuledTable>
      {asked?.what === 'roles' && <RolesDialog user={asked.user} onClose={close} />}
      {asked?.what === 'access' && <AccessDialog user={asked.user} onClose={close} />}
    </>
  );
}
