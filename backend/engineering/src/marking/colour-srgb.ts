import type { Colour } from './colours';

/**
 * sRGB in which bands are drawn. The standard prescribes none; these are chosen so that neighbours in the table
 * (red and orange, violet and blue, gold and yellow, silver and grey) stay apart on light and dark bodies.
 */
export const colourSrgb: Readonly<Record<Colour, `#${string}`>> = {
  pink: '#f2a0b5',
  silver: '#c9cdd2',
  gold: '#b8923a',
  black: '#1b1a19',
  brown: '#6b3f22',
  red: '#c4281f',
  orange: '#f07a1c',
  yellow: '#f2d024',
  green: '#2e7d3c',
  blue: '#2459b8',
  violet: '#7d3f9d',
  grey: '#7c7f83',
  white: '#f7f5f0',
};
