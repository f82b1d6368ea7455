import { defineGlobalStyles } from '@chakra-ui/react';

export const globalStyles = defineGlobalStyles({
  '*, *::before, *::after': {
    boxSizing: 'border-box',
    borderColor: 'border',
    _motionReduce: {
      animationDuration: '0.01ms !important',
      transitionDuration: '0.01ms !important',
      scrollBehavior: 'auto !important',
    },
  },
  html: {
    colorPalette: 'accent',
    bg: 'bg',
    color: 'fg',
    fontFamily: 'body',
    fontSize: '16px',
    lineHeight: 'text',
    textSizeAdjust: '100%',
    _print: { bg: 'white', color: 'black' },
  },
  body: {
    margin: 0,
    fontSize: 'md',
    minHeight: '100dvh',
    fontVariantNumeric: 'tabular-nums lining-nums',
    fontKerning: 'normal',
  },
  'h1, h2, h3, h4, p, dl, dd, ul, ol, figure, fieldset': { margin: 0, padding: 0, border: 0 },
  'ul, ol': { listStyle: 'none' },
  'h1, h2, h3, h4': { fontSize: 'inherit', fontWeight: 'semibold', lineHeight: 'tight' },
  'a:not([class])': { color: 'accent' },
  'button, input, select, textarea': { font: 'inherit', color: 'inherit', letterSpacing: 'inherit' },
  sub: { lineHeight: 0 },
  button: { background: 'none', border: 0, padding: 0, cursor: 'pointer' },
  'nav, [data-screen-only]': { _print: { display: 'none !important' } },
  svg: { display: 'block', flexShrink: 0 },
  // One focus ring for everything that can take the keyboard.
  '*:focus-visible': { outline: '2px solid', outlineColor: 'accent.focusRing', outlineOffset: '2px' },
  '::selection': { bg: 'bg.selected' },
  '::placeholder': { color: 'fg.muted', opacity: 1 },
});
