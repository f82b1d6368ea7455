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
    '& [data-date]': { whiteSpace: 'nowrap' },
    '& small': { color: 'fg.muted', fontSize: 'xs', fontWeight: 'normal' },
    '& td > .not-stated:only-child': { whiteSpace: 'nowrap' },
    // What a row is about stays in sight while the rest of it is scrolled past.
    '& tr > :first-child': {
      position: 'sticky',
      insetInlineStart: 0,
      zIndex: 1,
      bg: 'bg',
      minWidth: { base: '8rem', md: '0' },
      maxWidth: { base: '9.5rem', md: 'none' },
      overflowWrap: { base: 'anywhere', md: 'break-word' },
    },
  },
});

export interface RuledTableProps {
  /** Names the table, and the strip that scrolls it where the screen is narrow. */
  label: string;
  /** Below this the table is scrolled rather than squeezed. */
  minWidth?: string;
  children: ReactNode;
}

/** A table short enough to be read as a whole, with hairlines between its rows. */
export function RuledTable({ label, minWidth, children }: RuledTableProps) {
  return (
    <Scroller role="group" aria-label={label} tabIndex={0}>
      <Table aria-label={label} style={{ minWidth }}>
        {children}
      </Table>
    </Scroller>
  );
}
