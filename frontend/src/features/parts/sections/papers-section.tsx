import { Link } from 'react-router-dom';
import { PlainTable } from '../../../components/plain-table';
import { dayWords } from '../../../wording/date-words';
import type { PartDetails } from '../requests/get-part';
import { Quiet, Section } from './section';

/** Certificates, declarations and the datasheet that the ratings come from. */
export function PapersSection({ part }: { part: PartDetails }) {
  const { certificates, declarations, revision } = part;
  return (
    <Section title="Papers">
      {certificates.length + declarations.length > 0 && (
        <PlainTable label="Certificates and declarations" headers={[{ words: 'Paper' }, { words: 'Date' }]}>
          {certificates.map((certificate) => (
            <tr key={certificate.number}>
              <td>
                {certificate.kind === 'safety' ? 'Safety certificate' : 'Automotive evidence'}{' '}
                {certificate.number}, {certificate.standard}
              </td>
              <td data-date>
                {dayWords(certificate.issuedOn)}
                {certificate.expiresOn !== undefined &&
                  ` to ${dayWords(certificate.expiresOn)}${certificate.expired ? ', expired' : ''}`}
              </td>
            </tr>
          ))}
          {declarations.map((declaration) => (
            <tr key={`${declaration.kind} ${declaration.datedOn}`}>
              <td>
                {declaration.kind}
                {declaration.exemption !== undefined && `, exemption ${declaration.exemption}`}{' '}
                <small>{declaration.statement}</small>
              </td>
              <td data-date>{dayWords(declaration.datedOn)}</td>
            </tr>
          ))}
        </PlainTable>
      )}
      <Quiet>
        Ratings of{' '}
        <Link to={`/families/${part.family.id}?revision=${revision.number}`}>revision {revision.number}</Link>
        , published {dayWords(revision.publishedAt)}
        {revision.datasheet !== undefined &&
          `, after ${revision.datasheet.documentNumber}, revision ${revision.datasheet.revision}`}
        .
      </Quiet>
    </Section>
  );
}
