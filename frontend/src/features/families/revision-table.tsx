import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { RuledTable } from '../../components/ruled-table';
import { dayWords } from '../../wording/date-words';
import type { FamilyDetails } from './requests/get-family';

export interface RevisionTableProps {
  revisions: FamilyDetails['revisions'];
  /** Number of the one on the page. */
  shown: number | undefined;
}

/** All revisions, the newest first; each opens on this page. */
export function RevisionTable({ revisions, shown }: RevisionTableProps) {
  return (
    <RuledTable label="Revisions">
      <thead>
        <tr>
          <th scope="col">Revision</th>
          <th scope="col">State</th>
          <th scope="col">What it brought</th>
          <th scope="col">Entered</th>
          <th scope="col">Published</th>
        </tr>
      </thead>
      <tbody>
        {revisions.map((revision) => (
          <tr key={revision.number} aria-current={revision.number === shown ? 'true' : undefined}>
            <th scope="row">
              <Link to={`?revision=${revision.number}`}>Revision {revision.number}</Link>
            </th>
            <td>{revision.current ? 'in force' : revision.state === 'draft' ? 'draft' : 'superseded'}</td>
            <chakra.td minWidth="12rem">{revision.description}</chakra.td>
            <td>
              {dayWords(revision.enteredAt)}
              <span className="not-stated"> {revision.enteredBy.name}</span>
            </td>
            <td>
              {revision.publishedAt === undefined ? (
                <span className="not-stated">not yet</span>
              ) : (
                <>
                  {dayWords(revision.publishedAt)}
                  <span className="not-stated"> {revision.publishedBy?.name}</span>
                </>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}
