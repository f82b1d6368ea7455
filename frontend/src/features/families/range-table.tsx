import { Figure } from '../../components/figure';
import { RuledTable } from '../../components/ruled-table';
import { Cited } from './cited';
import type { FamilyRevision } from './requests/family-revision';
import { sizeWords } from './size-words';

/** Which resistances exist, by size, tolerance and temperature coefficient. */
export function RangeTable({ revision }: { revision: FamilyRevision }) {
  const cited = (label: string, field: string) => (
    <Cited label={label} citations={revision.citations.filter((citation) => citation.field === field)} />
  );
  return (
    <RuledTable label="Resistance ranges">
      <thead>
        <tr>
          <th scope="col">Size</th>
          <th scope="col">{cited('Tolerance', 'tolerance')}</th>
          <th scope="col">{cited('TCR', 'tcr')}</th>
          <th scope="col">{cited('From', 'resistance')}</th>
          <th scope="col">To</th>
          <th scope="col">Series</th>
        </tr>
      </thead>
      <tbody>
        {revision.ranges.map((range) => (
          <tr key={`${range.size.id} ${range.tolerance} ${range.tcr ?? ''} ${range.min}`}>
            <th scope="row">{sizeWords(range.size)}</th>
            <td>
              <Figure value={range.tolerance} quantity="tolerance" />
            </td>
            <td>
              <Figure value={range.tcr} quantity="temperature-coefficient" />
            </td>
            <td>
              <Figure value={range.min} quantity="resistance" />
            </td>
            <td>
              <Figure value={range.max} quantity="resistance" />
            </td>
            <td>{range.series.join(', ')}</td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}
