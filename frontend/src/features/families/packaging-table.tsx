import { RuledTable } from '../../components/ruled-table';
import type { FamilyRevision } from './requests/family-revision';
import { sizeWords } from './size-words';

/** How the parts are packed, by size. */
export function PackagingTable({ packagings }: Pick<FamilyRevision, 'packagings'>) {
  return (
    <RuledTable label="Packagings">
      <thead>
        <tr>
          <th scope="col">Size</th>
          <th scope="col">Code</th>
          <th scope="col">Packaging</th>
          <th scope="col" data-number>
            Pieces
          </th>
        </tr>
      </thead>
      <tbody>
        {packagings.map((packaging) => (
          <tr key={`${packaging.size.id} ${packaging.code}`}>
            <th scope="row">{sizeWords(packaging.size)}</th>
            <td>{packaging.code}</td>
            <td>{packaging.description}</td>
            <td data-number>{packaging.quantity.toLocaleString('en')}</td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}
