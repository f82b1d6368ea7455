import { defineTokens } from '@chakra-ui/react';

const quarterRem = [0, 0.5, 1, 1.5, 2, 2.5, 3, 4, 5, 6, 7, 8, 10, 12, 14, 16, 20, 24] as const;
const steps = Object.fromEntries(quarterRem.map((step) => [String(step), { value: `${step / 4}rem` }]));

/** The raw scales: four-pixel steps, few text sizes, near-square corners. */
export const tokens = defineTokens({
  spacing: { ...steps, px: { value: '1px' } },
  sizes: {
    ...steps,
    full: { value: '100%' },
    prose: { value: '38rem' },
    form: { value: '24rem' },
    page: { value: '76rem' },
    dialog: { value: '30rem' },
  },
  radii: { none: { value: '0' }, sm: { value: '2px' }, md: { value: '3px' }, full: { value: '9999px' } },
  fonts: {
    body: { value: "'Source Sans 3 Variable', 'Source Sans 3', system-ui, sans-serif" },
    heading: { value: "'Source Sans 3 Variable', 'Source Sans 3', system-ui, sans-serif" },
  },
  fontSizes: {
    '2xs': { value: '0.75rem' },
    xs: { value: '0.8125rem' },
    sm: { value: '0.875rem' },
    md: { value: '0.9375rem' },
    lg: { value: '1.125rem' },
    xl: { value: '1.25rem' },
    '2xl': { value: '1.5rem' },
  },
  fontWeights: {
    normal: { value: 400 },
    medium: { value: 500 },
    semibold: { value: 600 },
    bold: { value: 700 },
  },
  lineHeights: { tight: { value: 1.2 }, row: { value: 1.3 }, text: { value: 1.5 } },
  zIndex: {
    sticky: { value: 10 },
    steady: { value: 11 },
    bar: { value: 20 },
    sheet: { value: 30 },
    popover: { value: 40 },
    dialog: { value: 50 },
    skip: { value: 60 },
  },
  durations: { fast: { value: '120ms' }, moderate: { value: '180ms' } },
});
