import { chakra } from '@chakra-ui/react';
import { changedFields, fieldWords } from './changed-fields';
import type { AuditEntry } from './requests/list-audit';

/** What was there before is compared line by line; what is new altogether is read on. */
const inALine = {
  '& > li': { display: 'inline' },
  '& > li:not(:last-child)::after': { content: '"; "' },
} as const;

/** What a change took away and what it put there, field by field. */
export function Changes({ entry }: { entry: AuditEntry }) {
  const changes = changedFields(entry);
  if (changes.length === 0) return <span className="not-stated">no field changed</span>;
  return (
    <chakra.ul overflowWrap="anywhere" css={entry.before === undefined ? inALine : undefined}>
      {changes.map(({ field, before, after }) => (
        <li key={field}>
          <chakra.span color="fg.muted">{fieldWords(field)}: </chakra.span>
          {before !== undefined && <chakra.del color="fg.muted">{before}</chakra.del>}
          {before !== undefined && after !== undefined && ' → '}
          {after !== undefined && <chakra.ins textDecoration="none">{after}</chakra.ins>}
        </li>
      ))}
    </chakra.ul>
  );
}
