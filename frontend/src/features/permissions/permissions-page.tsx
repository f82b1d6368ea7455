import { chakra } from '@chakra-ui/react';
import type { Schema } from '../../api/schema';
import { Answered } from '../../components/answered';
import { Page } from '../../components/page';
import { RuledTable } from '../../components/ruled-table';
import { roleWords } from '../../wording/role-words';
import { type PermissionLine, permissionLines } from './permission-lines';
import { actionWords, subjectWords } from './permission-words';
import { usePermissions } from './requests/get-permissions';

const mayWords = { always: 'may', conditional: 'may, if' } as const;

function Line({ line, roles }: { line: PermissionLine; roles: readonly Schema<'Role'>[] }) {
  return (
    <tr>
      <chakra.th scope="row" whiteSpace={{ md: 'nowrap' }}>
        {actionWords(line.action)} <chakra.span fontWeight="normal">{subjectWords(line.subject)}</chakra.span>
      </chakra.th>
      {roles.map((role) => {
        const may = line.roles[role];
        return (
          <chakra.td
            key={role}
            whiteSpace="nowrap"
            fontWeight={may === 'conditional' ? 'semibold' : undefined}
          >
            {may === undefined ? <span className="not-stated">no</span> : mayWords[may]}
          </chakra.td>
        );
      })}
      <chakra.td minWidth="18rem" color="fg.muted">
        {line.sentences.join(' ')}
      </chakra.td>
    </tr>
  );
}

/** The rules that the server enforces, as it states them itself. */
export function Component() {
  const permissions = usePermissions();
  return (
    <Page
      title="Who may do what"
      lead="The rules in force on the server, by role. “May, if” depends on the thing itself; the sentence says how."
    >
      <Answered query={permissions} label="Reading the rules" lines={12}>
        {({ roles, rows }) => (
          <RuledTable label="Rules by role">
            <thead>
              <tr>
                <th scope="col">To</th>
                {roles.map((role) => (
                  <th key={role} scope="col">
                    {roleWords[role]}
                  </th>
                ))}
                <th scope="col">The rule</th>
              </tr>
            </thead>
            <tbody>
              {permissionLines(rows).map((line) => (
                <Line key={`${line.subject} ${line.action}`} line={line} roles={roles} />
              ))}
            </tbody>
          </RuledTable>
        )}
      </Answered>
    </Page>
  );
}
