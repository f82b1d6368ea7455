import { createSystem, defaultBaseConfig, defineConfig } from '@chakra-ui/react';
import { globalStyles } from './global-styles';
import { dialogRecipe } from './recipes/dialog';
import { menuRecipe, popoverRecipe } from './recipes/menu';
import { rowStyles } from './row-styles';
import { semanticTokens } from './semantic-tokens';
import { tokens } from './tokens';

/** Only the recipes in use: the full default set would weigh more than all our own screens. */
export const system = createSystem(
  defaultBaseConfig,
  defineConfig({
    cssVarsPrefix: 'resistry',
    cssVarsRoot: ':where(html)',
    preflight: false,
    globalCss: { ...globalStyles, ...rowStyles },
    theme: {
      breakpoints: { sm: '30rem', md: '48rem', lg: '64rem', xl: '80rem' },
      keyframes: {
        appear: { from: { opacity: 0 }, to: { opacity: 1 } },
        rise: { from: { opacity: 0, transform: 'translateY(6px)' }, to: { opacity: 1, transform: 'none' } },
        breathe: { '0%, 100%': { opacity: 1 }, '50%': { opacity: 0.45 } },
      },
      tokens,
      semanticTokens,
      slotRecipes: { dialog: dialogRecipe, menu: menuRecipe, popover: popoverRecipe },
    },
  }),
);
