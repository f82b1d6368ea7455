import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Scroller = chakra('div', {
  base: {
    overflowX: 'auto',
    '& table': { borderCollapse: 'collapse', width: 'full', minWidth: '44rem', fontSize: 'sm' },
    '& th': {
      textAlign: 'start',
      fontSize: '2xs',
      fontWeight: 'semibold',
      color: 'fg.muted',
      whiteSpace: 'nowrap',
      verticalAlign: 'bottom',
    },
    '& th, & td': { pe: 4, py: 1.5, borderBottom: '1px solid', borderColor: 'border' },
    '& thead th': { borderBottom: '1.5px solid', borderColor: 'fg' },
    '& tbody th': {
      fontSize: 'sm',
      fontWeight: 'normal',
      color: 'fg',
      whiteSpace: 'normal',
      verticalAlign: 'baseline',
    },
    '& td': { verticalAlign: 'baseline' },
    '& [data-align=end]': { textAlign: 'end', whiteSpace: 'nowrap' },
    '& small': { color: 'fg.muted', fontSize: '2xs' },
  },
});

export interface PlainTableProps {
  /** Names the table, and what scrolls where it is wider than its place. */
  label: string;
  headers: readonly { words: string; align?: 'end' }[];
  children: ReactNode;
}

/** A short table of a page: all its rows are there. Its rows are plain `tr` elements. */
export function PlainTable({ label, headers, children }: PlainTableProps) {
  return (
    <Scroller role="group" aria-label={label} tabIndex={0}>
      <table aria-label={label}>
        <thead>
          <tr>
            {headers.map(({ words, align }) => (
              <th key={words} scope="col" data-align={align}>
                {words}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </Scroller>
  );
}
