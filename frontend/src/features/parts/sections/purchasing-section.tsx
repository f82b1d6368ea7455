import { Link } from 'react-router-dom';
import { PlainTable } from '../../../components/plain-table';
import { StatusWord } from '../../../components/status-word';
import { dayWords } from '../../../wording/date-words';
import { priceWords } from '../../search/results/part-figures';
import type { PartDetails } from '../requests/get-part';
import { Quiet, Section } from './section';

const count = new Intl.NumberFormat('en');

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
          { words: 'Place', align: 'end' },
          { words: 'Part' },
          { words: 'Approval' },
          { words: 'Supply' },
          { words: '€ at 1,000', align: 'end' },
        ]}
      >
        {part.sources.map((source) => (
          <tr key={source.id}>
            <td data-align="end">{source.position}</td>
            <td>
              {source.id === part.id ? (
                <b>{source.manufacturerPartNumber}</b>
              ) : (
                <Link to={`/parts/${source.id}${search}`}>{source.manufacturerPartNumber}</Link>
              )}{' '}
              <small>
                {source.manufacturer.name} {source.family.code}
              </small>
            </td>
            <td>
              <StatusWord kind="approval" status={source.approval} />
            </td>
            <td>
              <StatusWord kind="supply" status={source.supply} />
              {source.lastOrderOn !== undefined && <small> last order {dayWords(source.lastOrderOn)}</small>}
            </td>
            <td data-align="end">{priceWords(source.unitPrice)}</td>
          </tr>
        ))}
      </PlainTable>
    </Section>
  );
}

/** Every quantity at which some offer changes its price, so that offers stand below each other. */
const quantitiesOf = (offers: PartDetails['offers']): number[] =>
  [...new Set(offers.flatMap((offer) => offer.priceBreaks.map((each) => each.quantity)))].sort(
    (first, second) => first - second,
  );

/** Offers with their price breaks; those in force first. */
export function OffersSection({ part }: { part: PartDetails }) {
  const quantities = quantitiesOf(part.offers);
  return (
    <Section title="Offers">
      {part.offers.length === 0 ? (
        <Quiet>No supplier has offered it.</Quiet>
      ) : (
        <PlainTable
          label="Offers, € a piece"
          headers={[
            { words: 'Supplier' },
            { words: 'Valid' },
            { words: 'Order', align: 'end' },
            { words: 'Lead time', align: 'end' },
            ...quantities.map((quantity) => ({
              words: `€ from ${count.format(quantity)}`,
              align: 'end' as const,
            })),
          ]}
        >
          {part.offers.map((offer) => (
            <tr key={offer.id}>
              <td>
                {offer.supplier.name} <small>packaging {offer.packaging}</small>
              </td>
              <td>
                {dayWords(offer.validFrom)} to {dayWords(offer.validUntil)}
                {!offer.inForce && <small> not in force</small>}
              </td>
              <td data-align="end">
                {count.format(offer.minimumOrder)}
                <small> by {count.format(offer.orderMultiple)}</small>
              </td>
              <td data-align="end">{offer.leadTimeDays} days</td>
              {quantities.map((quantity) => (
                <td key={quantity} data-align="end">
                  {offer.priceBreaks.find((each) => each.quantity === quantity)?.unitPrice.toFixed(4) ?? ''}
                </td>
              ))}
            </tr>
          ))}
        </PlainTable>
      )}
      {part.orderingCodes.length > 0 && (
        <Quiet>
          Ordering codes:{' '}
          {part.orderingCodes
            .map(
              ({ code, description, quantity }) =>
                `${code ?? 'not written by its template'} (${description}, ${count.format(quantity)})`,
            )
            .join(', ')}
        </Quiet>
      )}
    </Section>
  );
}
