import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { RuledTable } from '../../components/ruled-table';
import { momentWords } from '../../wording/date-words';
import { actionWords, subjectWords } from '../permissions/permission-words';
import { Changes } from './changes';
import type { AuditEntry } from './requests/list-audit';

/** Things that have a page of their own. */
const pages: Record<string, string> = { Part: '/parts/', Family: '/families/' };

function Subject({ entry }: { entry: AuditEntry }) {
  // An offer is known by its part, which stays the same and so stands in no line of what changed.
  const part = entry.subjectType === 'Offer' ? (entry.after?.part ?? entry.before?.part) : undefined;
  const of = typeof part === 'string' ? ` for ${part}` : '';
  const words = `${subjectWords(entry.subjectType)} ${entry.subjectId}${of}`;
  const page = pages[entry.subjectType];
  return page === undefined ? <>{words}</> : <Link to={`${page}${entry.subjectId}`}>{words}</Link>;
}

/** Who did what to what, when and why. */
export function AuditTable({ entries }: { entries: readonly AuditEntry[] }) {
  return (
    <RuledTable label="Audit trail">
      <thead>
        <tr>
          <th scope="col">When</th>
          <th scope="col">Who</th>
          <th scope="col">What</th>
          <th scope="col">Changed</th>
          <th scope="col">Why</th>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <tr key={entry.id}>
            <chakra.td whiteSpace={{ md: 'nowrap' }}>{momentWords(entry.recordedAt)}</chakra.td>
            <chakra.td whiteSpace="nowrap">{entry.actorName}</chakra.td>
            <chakra.th scope="row" minWidth="10rem">
              {actionWords(entry.action)}{' '}
              <chakra.span fontWeight="normal">
                <Subject entry={entry} />
              </chakra.span>
            </chakra.th>
            <chakra.td minWidth="20rem">
              <Changes entry={entry} />
            </chakra.td>
            <chakra.td minWidth="14rem" color="fg.muted" whiteSpace="pre-line">
              {entry.reason}
            </chakra.td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}
