import { defineGlobalStyles } from '@chakra-ui/react';

/**
 * Looks of what stands in tables by the thousand: plain elements with a class or a data attribute, because composing
 * styles for each of them while scrolling is what makes a long table stutter.
 */
export const rowStyles = defineGlobalStyles({
  '.figure': { whiteSpace: 'nowrap' },
  '.figure .unit': { color: 'fg.muted', fontWeight: 'normal', fontSize: '0.92em' },
  '.figure.aligned': { display: 'inline-grid', gridTemplateColumns: '1fr 4.9ch', width: 'full' },
  '.figure.aligned > :first-of-type': { textAlign: 'right' },
  '.figure.aligned > :last-of-type': { textAlign: 'left' },
  '.not-stated': { color: 'fg.muted', fontWeight: 'normal' },

  '.margin-rule': { width: 'full', height: '0.75rem', overflow: 'visible' },
  '.margin-rule rect': { transition: 'x 180ms, width 180ms' },
  '.margin-rule .track': { color: 'border.track' },
  '.margin-rule .demand': { color: 'fg' },
  '.margin-rule [data-status=met]': { color: 'met' },
  '.margin-rule [data-status=unmet]': { color: 'unmet' },
  '.margin-rule [data-status=unrated]': { color: 'unrated' },

  '.margin-word': { whiteSpace: 'nowrap', fontWeight: 'semibold' },
  '.margin-word[data-status=met]': { color: 'fg' },
  '.margin-word[data-status=unmet]': { color: 'unmet' },
  '.margin-word[data-status=unrated]': { color: 'unrated', fontWeight: 'normal' },

  '.status-word': { display: 'inline-flex', alignItems: 'baseline', gap: 1.5, whiteSpace: 'nowrap' },
  // Its own bottom would stand on the line of the words; a shape is centred on their height.
  '.status-word svg': {
    width: '0.75rem',
    height: '0.75rem',
    position: 'relative',
    top: '0.1em',
    flexShrink: 0,
  },
  '.status-word[data-strong]': { fontWeight: 'semibold' },
  '.status-word[data-tone=preferred] svg': { color: 'preferred' },
  '.status-word[data-tone=met] svg': { color: 'met' },
  '.status-word[data-tone=unmet] svg': { color: 'unmet' },
  '.status-word[data-tone=unrated] svg': { color: 'unrated' },
  '.status-word[data-tone=caution] svg': { color: 'caution' },
  '.status-word[data-tone=quiet] svg': { color: 'fg.muted' },
});
