import { chakra } from '@chakra-ui/react';
import { RuledTable } from '../../components/ruled-table';
import { dayWords } from '../../wording/date-words';
import type { FamilyDetails } from './requests/get-family';
import { sizeWords } from './size-words';

type Papers = Pick<FamilyDetails, 'declarations' | 'certificates' | 'datasheets'>;

const kindWords = { safety: 'Safety', automotive: 'Automotive' } as const;

function Certificates({ certificates }: Pick<Papers, 'certificates'>) {
  return (
    <RuledTable label="Certificates">
      <thead>
        <tr>
          <th scope="col">Certificate</th>
          <th scope="col">Standard</th>
          <th scope="col">Covers</th>
          <th scope="col">Issued</th>
          <th scope="col">Valid to</th>
        </tr>
      </thead>
      <tbody>
        {certificates.map((certificate) => (
          <tr key={`${certificate.kind} ${certificate.number} ${certificate.size?.id ?? ''}`}>
            <th scope="row">
              {kindWords[certificate.kind]} {certificate.number}
            </th>
            <td>{certificate.standard}</td>
            <td>{certificate.size === undefined ? 'every size' : sizeWords(certificate.size)}</td>
            <td>{dayWords(certificate.issuedOn)}</td>
            <td>
              {certificate.expiresOn === undefined ? 'does not expire' : dayWords(certificate.expiresOn)}
              {certificate.expired && (
                <chakra.b color="unmet" fontWeight="semibold">
                  {' '}
                  expired
                </chakra.b>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}

function Datasheets({ datasheets }: Pick<Papers, 'datasheets'>) {
  return (
    <RuledTable label="Datasheets">
      <thead>
        <tr>
          <th scope="col">Datasheet</th>
          <th scope="col">Revision</th>
          <th scope="col">Title</th>
          <th scope="col">Issued</th>
          <th scope="col" data-number>
            Pages
          </th>
        </tr>
      </thead>
      <tbody>
        {datasheets.map((datasheet) => (
          <tr key={datasheet.id}>
            <th scope="row">{datasheet.documentNumber}</th>
            <td>{datasheet.revision}</td>
            <td>{datasheet.title}</td>
            <td>{dayWords(datasheet.issuedOn)}</td>
            <td data-number>{datasheet.pageCount}</td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}

/** Declarations of substances, certificates and datasheets, each said to be missing where there is none. */
export function FamilyPapers({ declarations, certificates, datasheets }: Papers) {
  return (
    <chakra.div display="grid" gap={5} gridTemplateColumns="minmax(0, 1fr)">
      {declarations.length === 0 ? (
        <p className="not-stated">No declaration of substances is on file.</p>
      ) : (
        <chakra.ul display="grid" gap={2} maxWidth="prose">
          {declarations.map(({ kind, datedOn, exemption, statement }) => (
            <li key={`${kind} ${datedOn}`}>
              <b>{kind}</b> <span className="not-stated">of {dayWords(datedOn)}</span> {statement}
              {exemption !== undefined && ` Exemption ${exemption}.`}
            </li>
          ))}
        </chakra.ul>
      )}
      {certificates.length === 0 ? (
        <p className="not-stated">No certificate is on file.</p>
      ) : (
        <Certificates certificates={certificates} />
      )}
      {datasheets.length === 0 ? (
        <p className="not-stated">No datasheet is on file.</p>
      ) : (
        <Datasheets datasheets={datasheets} />
      )}
    </chakra.div>
  );
}
