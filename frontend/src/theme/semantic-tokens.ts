import { defineSemanticTokens } from '@chakra-ui/react';
import { type ColourPair, grounds, inks, lines } from './colours';

const token = (pair: ColourPair) => ({ value: { _light: pair.light, _dark: pair.dark } });

/** What a colour means. Components name these and never a raw colour. */
export const semanticTokens = defineSemanticTokens({
  colors: {
    bg: {
      DEFAULT: token(grounds.page),
      panel: token(grounds.sheet),
      field: token(grounds.field),
      selected: token(grounds.selected),
      basis: token(grounds.basis),
      hover: token(grounds.hover),
    },
    fg: { DEFAULT: token(inks.ink), muted: token(inks.muted) },
    border: { DEFAULT: token(lines.hairline), field: token(lines.field), track: token(lines.track) },
    met: token(inks.met),
    unmet: token(inks.unmet),
    unrated: token(inks.unrated),
    preferred: token(inks.preferred),
    caution: token(inks.caution),
    accent: {
      DEFAULT: token(inks.accent),
      solid: token(inks.accent),
      fg: token(inks.accent),
      contrast: token({ light: grounds.sheet.light, dark: grounds.field.dark }),
      subtle: token(grounds.basis),
      muted: token(grounds.selected),
      emphasized: token(grounds.selected),
      focusRing: token(inks.accent),
      border: token(inks.accent),
    },
  },
});
