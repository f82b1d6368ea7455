import type { ReactNode } from 'react';
import { RuledTable } from './ruled-table';

/** Room that a column needs so that its words are not broken into single ones. */
const roomOfColumn = 7.5;

export interface PlainTableProps {
  label: string;
  headers: readonly { words: string; number?: boolean }[];
  /** The rows, as plain `tr` elements. */
  children: ReactNode;
}

/** A ruled table of which only the rows are left to be said. */
export function PlainTable({ label, headers, children }: PlainTableProps) {
  return (
    <RuledTable label={label} minWidth={`${headers.length * roomOfColumn}rem`}>
      <thead>
        <tr>
          {headers.map(({ words, number }) => (
            <th key={words} scope="col" data-number={number}>
              {words}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>{children}</tbody>
    </RuledTable>
  );
}
