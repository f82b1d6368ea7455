import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Scroller = chakra('div', { base: { overflowX: 'auto', maxWidth: 'full', position: 'relative' } });

const Table = chakra('table', {
  base: {
    width: 'full',
    borderCollapse: 'collapse',
    fontSize: 'sm',
    lineHeight: 'row',
    '& th, & td': {
      textAlign: 'start',
      verticalAlign: 'baseline',
      py: 2,
      pe: 4,
      borderBottom: '1px solid',
      borderColor: 'border',
    },
    '& thead th': { color: 'fg.muted', fontSize: 'xs', fontWeight: 'semibold', whiteSpace: 'nowrap' },
    '& tbody th': { fontWeight: 'semibold' },
    '& [data-number]': { textAlign: 'end', whiteSpace: 'nowrap' },
  },
});

export interface RuledTableProps {
  /** Names the table, and the strip that scrolls it where the screen is narrow. */
  label: string;
  children: ReactNode;
}

/** A table short enough to be read as a whole, with hairlines between its rows. */
export function RuledTable({ label, children }: RuledTableProps) {
  return (
    <Scroller role="group" aria-label={label} tabIndex={0}>
      <Table aria-label={label}>{children}</Table>
    </Scroller>
  );
}
