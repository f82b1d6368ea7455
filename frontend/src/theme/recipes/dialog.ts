import { defineSlotRecipe } from '@chakra-ui/react';
import { dialogAnatomy } from '@chakra-ui/react/anatomy';

export const dialogRecipe = defineSlotRecipe({
  className: 'dialog',
  slots: dialogAnatomy.keys(),
  base: {
    backdrop: {
      position: 'fixed',
      inset: 0,
      zIndex: 'dialog',
      bg: { _light: 'rgb(29 40 48 / 0.45)', _dark: 'rgb(0 0 0 / 0.6)' },
      _open: { animation: 'appear 120ms ease-out' },
    },
    positioner: {
      position: 'fixed',
      inset: 0,
      zIndex: 'dialog',
      display: 'flex',
      alignItems: 'flex-start',
      justifyContent: 'center',
      overflowY: 'auto',
      px: 4,
      py: { base: 4, md: 20 },
    },
    content: {
      width: '100%',
      maxWidth: 'dialog',
      bg: 'bg.panel',
      borderRadius: 'md',
      borderWidth: '1px',
      borderStyle: 'solid',
      borderColor: 'border',
      p: { base: 5, md: 6 },
      outline: 0,
      _open: { animation: 'rise 180ms ease-out' },
    },
    title: { fontSize: 'lg', fontWeight: 'semibold', lineHeight: 'tight' },
    description: { color: 'fg.muted', mt: 1 },
    body: { mt: 4 },
    footer: { display: 'flex', flexWrap: 'wrap', justifyContent: 'flex-end', gap: 3, mt: 6 },
  },
});
