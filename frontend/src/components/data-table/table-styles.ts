import { chakra } from '@chakra-ui/react';

/** Height of the head with its rule, px. */
export const headHeight = 42;

/**
 * All styles of the table in one class, so that a row carries none of its own. Each row is a grid of a fixed height that
 * nothing in it can change, so that only the row itself is laid out when it comes; as cells of one table all of them
 * would be. (They stay in the flow: browsers style what is positioned out of it ten times as slowly.)
 */
export const TableFrame = chakra('div', {
  base: {
    '& table': { display: 'block', minWidth: 'var(--least-width)', width: 'full' },
    '& tr': { display: 'grid', gridTemplateColumns: 'var(--columns)' },
    '& thead': {
      display: 'block',
      position: 'sticky',
      top: 0,
      zIndex: 'sticky',
      bg: 'bg',
      borderBottom: '1.5px solid',
      borderColor: 'fg',
    },
    '& th': {
      display: 'block',
      alignContent: 'center',
      height: `${headHeight - 2}px`,
      overflow: 'hidden',
      textOverflow: 'ellipsis',
      textAlign: 'start',
      fontSize: '2xs',
      fontWeight: 'semibold',
      color: 'fg.muted',
      pe: 2.5,
      whiteSpace: 'nowrap',
    },
    '& th button': { fontWeight: 'inherit', minHeight: '1.5rem', whiteSpace: 'nowrap' },
    '& th button:hover': { color: 'accent' },
    '& th[aria-sort=ascending], & th[aria-sort=descending]': { color: 'fg' },
    '& tbody': { display: 'block' },
    '& tbody tr': {
      height: 'var(--row-height)',
      contain: 'strict',
      borderBottom: '1px solid',
      borderColor: 'border',
      cursor: 'pointer',
    },
    '& td': {
      display: 'block',
      alignContent: 'center',
      pe: 2.5,
      fontSize: 'xs',
      lineHeight: 'row',
      overflow: 'hidden',
      textOverflow: 'ellipsis',
      whiteSpace: 'nowrap',
      // Clear of the head and of the column that stays when the keyboard leads to a cell.
      scrollMarginTop: `${headHeight}px`,
      scrollMarginInlineStart: '9rem',
    },
    '& [data-align=end]': { textAlign: 'end' },
    '& [data-stays]': { position: 'sticky', insetInlineStart: 0, zIndex: 1, bg: 'bg', ps: 2 },
    // Each colour by name: a cell that inherits its row's costs the browser ten times as much to style.
    '& tbody tr:hover, & tr:hover [data-stays]': { bg: 'bg.hover' },
    '& tr[data-level="2"], & tr[data-level="2"] [data-stays]': { bg: 'bg.hover' },
    '& tr[aria-selected=true], & tr[aria-selected=true] [data-stays]': { bg: 'bg.selected' },
    '& table:focus-visible': { outline: 'none' },
    '& table:focus-visible tr[data-active]': { borderBottomColor: 'accent' },
    '& table:focus-visible td[data-active]': {
      outline: '2px solid',
      outlineColor: 'accent.focusRing',
      outlineOffset: '-2px',
    },
    '& [data-waiting]': {
      display: 'block',
      height: 2,
      width: '60%',
      bg: 'border',
      borderRadius: 'sm',
    },
    '& [data-unfold]': { color: 'accent', whiteSpace: 'nowrap', minHeight: 6 },
    '& [data-unfold]::before': { content: '"▸"', display: 'inline-block', width: '1.1em' },
    '& [data-unfold][aria-expanded=true]::before': { content: '"▾"' },
    '& [data-unfold]:hover': { textDecoration: 'underline', textUnderlineOffset: '3px' },
    '& [data-beneath]': { ps: 3, borderInlineStart: '2px solid', borderColor: 'border.field' },
    '& [data-second]': {
      display: 'block',
      color: 'fg.muted',
      fontSize: '2xs',
      overflow: 'hidden',
      textOverflow: 'ellipsis',
    },
  },
});
