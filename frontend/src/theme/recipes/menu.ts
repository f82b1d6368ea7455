import { defineSlotRecipe } from '@chakra-ui/react';
import { menuAnatomy, popoverAnatomy } from '@chakra-ui/react/anatomy';

const floating = {
  bg: 'bg.panel',
  borderWidth: '1px',
  borderStyle: 'solid',
  borderColor: 'border',
  borderRadius: 'md',
  zIndex: 'popover',
  outline: 0,
  _open: { animation: 'appear 120ms ease-out' },
} as const;

export const menuRecipe = defineSlotRecipe({
  className: 'menu',
  slots: menuAnatomy.keys(),
  base: {
    content: { ...floating, minWidth: '12rem', py: 1 },
    item: {
      display: 'flex',
      alignItems: 'center',
      gap: 2,
      px: 3,
      py: 2,
      cursor: 'pointer',
      color: 'fg',
      textDecoration: 'none',
      fontSize: 'sm',
      _highlighted: { bg: 'bg.hover' },
    },
    separator: { height: '1px', bg: 'border', my: 1 },
    itemGroupLabel: { px: 3, py: 1, fontSize: 'xs', color: 'fg.muted' },
  },
});

export const popoverRecipe = defineSlotRecipe({
  className: 'popover',
  slots: popoverAnatomy.keys(),
  base: { content: { ...floating, p: 4, maxHeight: 'var(--available-height)', overflowY: 'auto' } },
});
