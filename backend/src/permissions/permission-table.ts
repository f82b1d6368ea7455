import { ACTIONS, SUBJECTS } from './actions-and-subjects';
import type { PermissionRow, PermissionTable } from './dto/permission-table.dto';
import { ROLES } from './roles';
import { rules } from './rules';

/** All the rules written out, one row for each role, deed and kind of thing that a rule allows. */
export function permissionTable(): PermissionTable {
  const rows = rules.flatMap((rule): PermissionRow[] =>
    rule.roles.flatMap((role) =>
      rule.actions.flatMap((action) =>
        rule.subjects.map((subject) => ({
          role,
          action,
          subject,
          conditional: rule.conditions !== undefined,
          sentence: rule.sentence,
        })),
      ),
    ),
  );
  return { roles: [...ROLES], actions: [...ACTIONS], subjects: [...SUBJECTS], rows };
}
