import { chakra } from '@chakra-ui/react';
import { DrawnPart } from '../../../components/drawn-part/drawn-part';
import { MarginRule } from '../../../components/margin-rule';
import { MarginWord } from '../../../components/margin-word';
import { StatusWord } from '../../../components/status-word';
import { checkWords } from '../../../wording/check-words';
import type { SearchItem } from '../requests/search-parts';
import { type SearchPart, leadingNumber, tightestCheck } from '../search-part';
import { bodyOfPart, priceWords, valueWords } from './part-figures';

export function BodyCell({ part }: { part: SearchPart }) {
  const body = bodyOfPart(part);
  return body === undefined ? null : <DrawnPart body={body} />;
}

/**
 * The company's number first, the manufacturer's beneath; where there is none, the manufacturer's alone. A source stands
 * below the number it shares, so it is told by its own.
 */
export function NumberCell({ part, beneath = false }: { part: SearchPart; beneath?: boolean }) {
  if (beneath) return <span data-beneath="">{part.manufacturerPartNumber}</span>;
  return part.companyPartNumber ? (
    <>
      <b>{part.companyPartNumber.number}</b>
      <span data-second="">{part.manufacturerPartNumber}</span>
    </>
  ) : (
    <>
      <b>{part.manufacturerPartNumber}</b>
      <span data-second="">no company number</span>
    </>
  );
}

/** The tightest check as a rule, with its name and figure beneath, and what there is too much of. */
export function MarginCell({
  assessment,
  overSpecification,
}: Pick<SearchItem, 'assessment' | 'overSpecification'>) {
  const check = tightestCheck(assessment.checks);
  if (check === undefined) return <span data-second="">nothing asked</span>;
  const [excess] = overSpecification;
  return (
    <>
      <MarginRule status={check.status} margin={check.margin} />
      <span data-second="">
        {checkWords[check.check].toLowerCase()} <MarginWord status={check.status} margin={check.margin} />
      </span>
      {excess !== undefined && <span data-second="">{excess}</span>}
    </>
  );
}

const NarrowFrame = chakra('div', {
  base: {
    display: 'grid',
    gridTemplateColumns: 'auto minmax(0, 1fr) auto',
    columnGap: 3,
    rowGap: 1,
    alignItems: 'center',
    whiteSpace: 'normal',
    '& > :nth-of-type(4)': { gridColumn: '1 / -1' },
  },
});

/** One result on a narrow screen: what decides, in two lines. A number has no body of its own, only its sources have. */
export function NarrowResult(item: SearchItem) {
  const { part, assessment, overSpecification, sources, beneath = false } = item;
  return (
    <NarrowFrame>
      <div>{sources === undefined && <BodyCell part={part} />}</div>
      <div>
        {beneath ? part.manufacturerPartNumber : <b>{leadingNumber(part)}</b>}
        <span data-second="">
          {part.manufacturer.name} {part.family.code}, {valueWords(part)}
        </span>
      </div>
      <div>
        <StatusWord kind="approval" status={part.approval} />
        <chakra.span display="block" textAlign="end" fontSize="xs">
          {part.unitPrice === undefined ? priceWords(undefined) : `€ ${priceWords(part.unitPrice)}`}
        </chakra.span>
      </div>
      <div>
        <MarginCell assessment={assessment} overSpecification={overSpecification} />
      </div>
    </NarrowFrame>
  );
}
