import { chakra } from '@chakra-ui/react';

/** The three columns of Find: duty, results, and the sheet where a part is open. */
export const Desk = chakra('div', {
  base: {
    display: 'grid',
    height: 'full',
    gridTemplateRows: 'minmax(0, 1fr)',
    gridTemplateColumns: { base: 'minmax(0, 1fr)', md: '16.5rem minmax(0, 1fr)' },
    '&[data-sheet=open]': {
      gridTemplateColumns: {
        base: 'minmax(0, 1fr)',
        md: '16.5rem minmax(0, 1fr)',
        xl: '16.5rem minmax(0, 1fr) 23.75rem',
      },
    },
  },
});

/** The column of the duty; on a narrow screen it covers the results while it is open. */
export const Panel = chakra('div', {
  base: {
    overflowY: 'auto',
    px: 5,
    py: 4,
    borderInlineEnd: '1px solid',
    borderColor: 'border',
    '&[data-open=false]': { display: { base: 'none', md: 'block' } },
    position: { base: 'fixed', md: 'static' },
    insetBlockStart: { base: '3.25rem', md: 'auto' },
    insetBlockEnd: { base: 0, md: 'auto' },
    insetInline: { base: 0, md: 'auto' },
    bg: 'bg',
    zIndex: { base: 'bar', md: 'auto' },
  },
});

const paneInset = { base: 4, md: 6 } as const;

/** The column of the results, which scrolls by itself. */
export const Pane = chakra('div', {
  base: {
    overflow: 'auto',
    position: 'relative',
    minWidth: 0,
    containerType: 'inline-size',
    // As wide as the table where that is wider than the pane. Insets lie inside of what scrolls: what stays in sight
    // would stop short of the edge by a padding of the pane itself.
    '& > div': { width: 'max-content', minWidth: 'full', py: 4 },
  },
});

/** What does not go along when a wide table is scrolled sideways. */
export const Steady = chakra('div', {
  base: {
    position: 'sticky',
    insetInlineStart: 0,
    width: '100cqi',
    contain: 'inline-size',
    px: paneInset,
    // What opens from here lies over the head of the table.
    zIndex: 'steady',
  },
});

/** What a wide table scrolls. */
export const Wide = chakra('div', { base: { px: paneInset } });
