import { chakra } from '@chakra-ui/react';
import { changedFields } from './changed-fields';
import type { AuditEntry } from './requests/list-audit';

/** What a change took away and what it put there, field by field. */
export function Changes({ entry }: { entry: AuditEntry }) {
  const changes = changedFields(entry);
  if (changes.length === 0) return <span className="not-stated">no field changed</span>;
  return (
    <chakra.ul overflowWrap="anywhere">
      {changes.map(({ field, before, after }) => (
        <li key={field}>
          <span className="not-stated">{field}: </span>
          {before !== undefined && <chakra.del color="fg.muted">{before}</chakra.del>}
          {before !== undefined && after !== undefined && ' → '}
          {after !== undefined && <chakra.ins textDecoration="none">{after}</chakra.ins>}
        </li>
      ))}
    </chakra.ul>
  );
}
