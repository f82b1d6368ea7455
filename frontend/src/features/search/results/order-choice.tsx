import { chakra } from '@chakra-ui/react';
import { SelectField } from '../../../components/select-field';
import type { DataColumn, Sort } from '../../../components/data-table/data-column';

export interface OrderChoiceProps {
  columns: readonly Pick<DataColumn<never>, 'id' | 'header' | 'sortable'>[];
  sort: Sort | undefined;
  onSort: (sort: Sort | undefined) => void;
}

/** The order of the list where there are no heads of columns to press. */
export function OrderChoice({ columns, sort, onSort }: OrderChoiceProps) {
  const options = [
    { value: '', words: 'preferred, then cheapest' },
    ...columns
      .filter((column) => column.sortable === true)
      .flatMap(({ id, header }) => [
        { value: id, words: `${header}, rising` },
        { value: `-${id}`, words: `${header}, falling` },
      ]),
  ];
  return (
    <chakra.div pt={3}>
      <SelectField
        label="Order"
        value={sort === undefined ? '' : `${sort.descending ? '-' : ''}${sort.column}`}
        options={options}
        onValue={(value) => {
          const descending = value.startsWith('-');
          onSort(value === '' ? undefined : { column: value.slice(descending ? 1 : 0), descending });
        }}
      />
    </chakra.div>
  );
}
