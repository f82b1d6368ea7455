import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { useAbility } from '../../api/ability';
import { Button } from '../../components/button';
import { PlainTable } from '../../components/plain-table';
import { dayWords } from '../../wording/date-words';
import { Quiet, Section } from '../parts/sections/section';
import { EndOfferDialog } from './end-offer-dialog';
import { OfferDialog } from './offer-dialog';
import type { OfferedPart } from './offered-part';
import { priceColumns } from './price-columns';
import type { Offer } from './requests/change-offer';

const count = new Intl.NumberFormat('en');

type Dialog = { deed: 'enter' } | { deed: 'change' | 'end'; id: number };

function stateWords({ inForce, endedAt, validFrom }: Offer, today: string): string {
  if (inForce) return '';
  if (endedAt !== undefined) return ` ended ${dayWords(endedAt)}`;
  return validFrom > today ? ' not yet in force' : ' expired';
}

/** Offers with their price breaks, those in force first; purchasing enters, changes and ends them here. */
export function OffersSection({ part }: { part: OfferedPart }) {
  const ability = useAbility();
  const [dialog, setDialog] = useState<Dialog>();
  const { quantities, words } = priceColumns(part.offers);
  const mayChange = ability.can('update', 'Offer');
  const today = new Date().toISOString().slice(0, 10);
  const chosen =
    dialog === undefined || dialog.deed === 'enter'
      ? undefined
      : part.offers.find(({ id }) => id === dialog.id);
  // One that is late to close must not take the next one along.
  const close = (): void => setDialog((now) => (now === dialog ? undefined : now));
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
            { words: 'Order', number: true },
            { words: 'Lead time', number: true },
            ...quantities.map((quantity) => ({
              words: `€ from ${count.format(quantity)}`,
              number: true,
            })),
            ...(mayChange ? [{ words: 'Change' }] : []),
          ]}
        >
          {part.offers.map((offer) => (
            <tr key={offer.id}>
              <th scope="row">
                {offer.supplier.name} <small>packaging {offer.packaging}</small>
              </th>
              <td>
                {dayWords(offer.validFrom)} to {dayWords(offer.validUntil)}
                <small>{stateWords(offer, today)}</small>
              </td>
              <td data-number>
                {count.format(offer.minimumOrder)}
                <small> by {count.format(offer.orderMultiple)}</small>
              </td>
              <td data-number>{offer.leadTimeDays} days</td>
              {quantities.map((quantity) => (
                <td key={quantity} data-number>
                  {words(offer, quantity)}
                </td>
              ))}
              {mayChange && (
                <td>
                  {offer.endedAt === undefined && (
                    <chakra.span display="inline-flex" gap={2}>
                      <Button variant="plain" onClick={() => setDialog({ deed: 'change', id: offer.id })}>
                        Change
                      </Button>
                      <Button variant="plain" onClick={() => setDialog({ deed: 'end', id: offer.id })}>
                        End
                      </Button>
                    </chakra.span>
                  )}
                </td>
              )}
            </tr>
          ))}
        </PlainTable>
      )}
      {ability.can('create', 'Offer') && (
        <Button mt={2} onClick={() => setDialog({ deed: 'enter' })}>
          Enter an offer
        </Button>
      )}
      {part.orderingCodes.length > 0 && (
        <Quiet mt={2}>
          Ordering codes:{' '}
          {part.orderingCodes
            .map(
              ({ code, description, quantity }) =>
                `${code ?? 'not written by its template'} (${description}, ${count.format(quantity)})`,
            )
            .join(', ')}
        </Quiet>
      )}
      {dialog?.deed === 'enter' && <OfferDialog part={part} onClose={close} />}
      {dialog?.deed === 'change' && chosen && <OfferDialog part={part} offer={chosen} onClose={close} />}
      {dialog?.deed === 'end' && chosen && <EndOfferDialog offer={chosen} onClose={close} />}
    </Section>
  );
}
