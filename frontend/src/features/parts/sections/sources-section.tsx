import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { PlainTable } from '../../../components/plain-table';
import { StatusWord } from '../../../components/status-word';
import { dayWords } from '../../../wording/date-words';
import { priceWords } from '../../search/results/part-figures';
import type { PartDetails } from '../requests/get-part';
import { Quiet, Section } from './section';

/** What may be bought under the company part number, in the order of the approved manufacturer list. */
export function SourcesSection({ part, search }: { part: PartDetails; search: string }) {
  const number = part.companyPartNumber?.number;
  if (number === undefined) {
    return (
      <Section title="Sources">
        <Quiet>It stands under no company part number, so nothing may be bought in its place.</Quiet>
      </Section>
    );
  }
  return (
    <Section title={`Sources under ${number}`}>
      <PlainTable
        label={`Sources under ${number}`}
        headers={[
          { words: 'Part' },
          { words: 'Place', number: true },
          { words: 'Approval' },
          { words: 'Supply' },
          { words: '€ at 1,000', number: true },
        ]}
      >
        {part.sources.map((source) => (
          <tr key={source.id}>
            <chakra.th scope="row" fontWeight="normal">
              {source.id === part.id ? (
                <b>{source.manufacturerPartNumber}</b>
              ) : (
                <Link to={`/parts/${source.id}${search}`}>{source.manufacturerPartNumber}</Link>
              )}{' '}
              <small>
                {source.manufacturer.name} {source.family.code}
              </small>
            </chakra.th>
            <td data-number>{source.position}</td>
            <td>
              <StatusWord kind="approval" status={source.approval} />
            </td>
            <td>
              <StatusWord kind="supply" status={source.supply} />
              {source.lastOrderOn !== undefined && <small> last order {dayWords(source.lastOrderOn)}</small>}
            </td>
            <td data-number>{priceWords(source.unitPrice)}</td>
          </tr>
        ))}
      </PlainTable>
    </Section>
  );
}
