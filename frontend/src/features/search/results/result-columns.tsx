import { formatQuantityParts } from '@resistry/engineering/notation/format-quantity-parts';
import type { DataColumn } from '../../../components/data-table/data-column';
import { Figure } from '../../../components/figure';
import { StatusWord } from '../../../components/status-word';
import { checkWords } from '../../../wording/check-words';
import { approvalWords, supplyWords } from '../../../wording/standing-words';
import { technologyWords } from '../../../wording/technology-words';
import type { SearchItem } from '../requests/search-parts';
import { leadingNumber, tightestCheck } from '../search-part';
import { priceWords, sizeCode } from './part-figures';
import { BodyCell, MarginCell, NarrowResult, NumberCell } from './result-cells';

type Column = DataColumn<SearchItem>;

/** The coefficient in the unit of its column. */
function Ppm({ tcr: perKelvin }: { tcr: number | undefined }) {
  if (perKelvin === undefined) return <span data-second="">not stated</span>;
  return formatQuantityParts(perKelvin, 'temperature-coefficient', { significantDigits: 3 }).figure;
}

const body: Column = {
  id: 'body',
  header: 'Body',
  plainHeader: 'Body',
  width: 4.2,
  cell: ({ part }) => <BodyCell part={part} />,
  plain: ({ part }) => part.bodyStyle,
};

const number: Column = {
  id: 'company-part-number',
  header: 'Part',
  plainHeader: 'Company part number',
  width: 7.4,
  fixed: true,
  stays: true,
  sortable: true,
  cell: ({ part, beneath }) => <NumberCell part={part} beneath={beneath} />,
  hint: ({ part }) =>
    [part.companyPartNumber?.number, part.manufacturerPartNumber].filter(Boolean).join(', '),
  plain: ({ part }) => part.companyPartNumber?.number ?? null,
};

const manufacturerNumber: Column = {
  id: 'part-number',
  header: 'Manufacturer’s number',
  plainHeader: 'Manufacturer part number',
  width: 9,
  sortable: true,
  hiddenAtFirst: true,
  cell: ({ part }) => part.manufacturerPartNumber,
  hint: ({ part }) => part.manufacturerPartNumber,
  plain: ({ part }) => part.manufacturerPartNumber,
};

const family: Column = {
  id: 'family',
  header: 'Family',
  plainHeader: 'Manufacturer and family',
  width: 6.4,
  sortable: true,
  cell: ({ part }) => (
    <>
      {part.family.code}
      <span data-second="">{part.manufacturer.name}</span>
    </>
  ),
  hint: ({ part }) => `${part.manufacturer.name} ${part.family.code}, ${part.family.name}`,
  plain: ({ part }) => `${part.manufacturer.name} ${part.family.code}`,
};

const technology: Column = {
  id: 'technology',
  header: 'Technology',
  plainHeader: 'Technology',
  width: 6.5,
  hiddenAtFirst: true,
  cell: ({ part }) => technologyWords[part.technology],
  plain: ({ part }) => technologyWords[part.technology],
};

const size: Column = {
  id: 'size',
  header: 'Size',
  plainHeader: 'Size, inch/metric',
  width: 3.4,
  sortable: true,
  cell: ({ part }) => (
    <>
      {part.size.code}
      <span data-second="">{part.size.metricCode ?? ''}</span>
    </>
  ),
  plain: ({ part }) => sizeCode(part),
};

const resistance: Column = {
  id: 'resistance',
  header: 'Value',
  plainHeader: 'Resistance, Ω',
  width: 4.2,
  align: 'end',
  sortable: true,
  cell: ({ part }) => <Figure value={part.resistance} quantity="resistance" aligned />,
  plain: ({ part }) => part.resistance,
};

const tolerance: Column = {
  id: 'tolerance',
  header: 'Tol.',
  plainHeader: 'Tolerance, fraction',
  width: 3.5,
  align: 'end',
  sortable: true,
  cell: ({ part }) => (part.resistance === 0 ? '' : <Figure value={part.tolerance} quantity="tolerance" />),
  plain: ({ part }) => part.tolerance ?? null,
};

const tcr: Column = {
  id: 'tcr',
  header: 'ppm/K',
  plainHeader: 'TCR, 1/K',
  width: 3.1,
  align: 'end',
  sortable: true,
  cell: ({ part }) => (part.resistance === 0 ? '' : <Ppm tcr={part.tcr} />),
  plain: ({ part }) => part.tcr ?? null,
};

const margin: Column = {
  id: 'margin',
  header: 'Tightest margin',
  plainHeader: 'Tightest margin, fraction',
  width: 9,
  sortable: true,
  cell: ({ assessment, overSpecification }) => (
    <MarginCell assessment={assessment} overSpecification={overSpecification} />
  ),
  hint: ({ overSpecification }) => overSpecification.join(', '),
  plain: ({ assessment }) => tightestCheck(assessment.checks)?.margin ?? null,
};

const tightest: Column = {
  id: 'tightestCheck',
  header: 'Tightest check',
  plainHeader: 'Tightest check',
  width: 8,
  hiddenAtFirst: true,
  cell: ({ assessment }) => checkWords[tightestCheck(assessment.checks)?.check ?? 'value'],
  plain: ({ assessment }) => tightestCheck(assessment.checks)?.check ?? null,
};

const dissipation: Column = {
  id: 'dissipation',
  header: 'Rated',
  plainHeader: 'Rated dissipation, W',
  width: 4.4,
  align: 'end',
  sortable: true,
  hiddenAtFirst: true,
  cell: ({ part }) =>
    part.resistance === 0 ? '' : <Figure value={part.ratedDissipation} quantity="power" />,
  plain: ({ part }) => part.ratedDissipation ?? null,
};

const secondSource: Column = {
  id: 'secondSource',
  header: 'Second source',
  plainHeader: 'Second source',
  width: 6,
  hiddenAtFirst: true,
  cell: ({ part }) => (part.secondSource ? 'yes' : 'none'),
  plain: ({ part }) => (part.secondSource ? 'yes' : 'no'),
};

const excess: Column = {
  id: 'excess',
  header: 'More than needed',
  plainHeader: 'More than needed',
  width: 12,
  sortable: true,
  hiddenAtFirst: true,
  cell: ({ overSpecification }) => overSpecification.join(', '),
  hint: ({ overSpecification }) => overSpecification.join(', '),
  plain: ({ overSpecification }) => overSpecification.join(', '),
};

const approval: Column = {
  id: 'approval',
  header: 'Approval',
  plainHeader: 'Approval',
  width: 5.2,
  sortable: true,
  cell: ({ part }) => <StatusWord kind="approval" status={part.approval} />,
  plain: ({ part }) => approvalWords[part.approval],
};

const supply: Column = {
  id: 'supply',
  header: 'Supply',
  plainHeader: 'Supply',
  width: 8,
  sortable: true,
  hiddenAtFirst: true,
  cell: ({ part }) => <StatusWord kind="supply" status={part.supply} />,
  plain: ({ part }) => supplyWords[part.supply],
};

const price: Column = {
  id: 'price',
  header: '€/1,000',
  plainHeader: 'Unit price at 1,000, EUR',
  width: 3.8,
  align: 'end',
  sortable: true,
  cell: ({ part }) => priceWords(part.unitPrice),
  plain: ({ part }) => part.unitPrice ?? null,
};

/** How many approved sources a number has; unfolds to each with its own assessment. */
const sourcesColumn: Column = {
  id: 'sources',
  header: 'Sources',
  plainHeader: 'Approved sources',
  width: 4.2,
  fixed: true,
  unfolds: true,
  cell: ({ sources }) =>
    sources === undefined ? '' : sources.length === 1 ? '1 source' : `${sources.length} sources`,
  plain: ({ sources }) => sources?.length ?? null,
};

/** A number has no body of its own, only its sources have; how many those are stands in its place. */
export const groupedColumns = (columns: readonly Column[]): Column[] => [
  ...columns.filter((column) => column !== body),
  sourcesColumn,
];

export const resultColumns: readonly Column[] = [
  body,
  number,
  manufacturerNumber,
  family,
  technology,
  size,
  resistance,
  tolerance,
  tcr,
  dissipation,
  margin,
  tightest,
  excess,
  approval,
  supply,
  secondSource,
  price,
];

/** On a narrow screen a row is one cell. */
export const narrowColumns: readonly Column[] = [
  {
    id: 'part',
    header: 'Parts',
    plainHeader: 'Part',
    width: 13.4,
    fixed: true,
    cell: (item) => <NarrowResult {...item} />,
    plain: ({ part }) => leadingNumber(part),
  },
];
