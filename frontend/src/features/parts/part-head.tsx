import { chakra } from '@chakra-ui/react';
import { DrawnPart } from '../../components/drawn-part/drawn-part';
import { StatusWord } from '../../components/status-word';
import { dayWords } from '../../wording/date-words';
import { technologyWords } from '../../wording/technology-words';
import { bodyOfPart, sizeCode, valueWords } from '../search/results/part-figures';
import { leadingNumber } from '../search/search-part';
import type { PartDetails } from './requests/get-part';

/** Who the part is and how it stands. */
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
          {part.manufacturer.name} {part.family.code}, {part.family.name}
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
          <chakra.p fontSize="sm" mt={1.5} borderInlineStart="3px solid" borderColor="caution" ps={3}>
            <b>Restricted.</b> {part.restriction.words}{' '}
            {part.restriction.scope === undefined
              ? 'It holds everywhere.'
              : `It holds for ${part.restriction.scope}.`}
          </chakra.p>
        )}
      </chakra.div>
    </chakra.header>
  );
}
