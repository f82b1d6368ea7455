import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { DrawnPart } from '../../components/drawn-part/drawn-part';
import { StatusWord } from '../../components/status-word';
import { dayWords } from '../../wording/date-words';
import { reviewWords } from '../../wording/standing-words';
import { technologyWords } from '../../wording/technology-words';
import { bodyOfPart, sizeCode, valueWords } from '../search/results/part-figures';
import { leadingNumber } from '../search/search-part';
import type { PartDetails } from './requests/get-part';

const Notice = chakra('p', {
  base: {
    borderInlineStart: '3px solid',
    borderColor: 'caution',
    ps: 3,
    mt: 1.5,
    fontSize: 'sm',
    whiteSpace: 'pre-line',
  },
});

/** Who the part is, how it stands and what it waits for. */
export function PartHead({ part }: { part: PartDetails }) {
  const body = bodyOfPart(part);
  return (
    <chakra.header display="flex" flexWrap="wrap" gap={6} alignItems="center">
      {body !== undefined && <DrawnPart body={body} size="page" labelled />}
      <chakra.div flex="1 1 20rem" minWidth={0}>
        <chakra.h1 fontSize="2xl" overflowWrap="anywhere">
          {leadingNumber(part)}
        </chakra.h1>
        <p>
          {part.companyPartNumber !== undefined && <b>{part.manufacturerPartNumber} </b>}
          {part.manufacturer.name} <Link to={`/families/${part.family.id}`}>{part.family.code}</Link>,{' '}
          {part.family.name}
        </p>
        <chakra.p color="fg.muted" fontSize="sm">
          {technologyWords[part.technology]}, {sizeCode(part)}, {valueWords(part)}
        </chakra.p>
        <chakra.p display="flex" flexWrap="wrap" columnGap={5} rowGap={1} mt={1.5} fontSize="sm">
          <StatusWord kind="approval" status={part.approval} />
          <StatusWord kind="supply" status={part.supply} />
          {part.lastOrderOn !== undefined && <span>last order on {dayWords(part.lastOrderOn)}</span>}
          <span>{part.secondSource ? 'has a second source' : 'no second source'}</span>
        </chakra.p>
        {part.restriction !== undefined && (
          <Notice>
            <b>Restricted.</b> {part.restriction.words}{' '}
            {part.restriction.scope === undefined
              ? 'It holds everywhere.'
              : `Scope: ${part.restriction.scope}.`}
          </Notice>
        )}
        {part.openReviews.map((review) => (
          <Notice key={review.id}>
            <b>{reviewWords[review.cause]}, waits for a review</b> since {dayWords(review.openedAt)}, opened
            by {review.openedBy.name}: {review.words}
          </Notice>
        ))}
      </chakra.div>
    </chakra.header>
  );
}
