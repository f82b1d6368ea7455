import { defineRecipe } from '@chakra-ui/react';

/** `solid` for the one act of a form, `quiet` for the others, `plain` for words in a line that do something. */
export const buttonRecipe = defineRecipe({
  className: 'button',
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 2,
    flexShrink: 0,
    cursor: 'pointer',
    whiteSpace: 'nowrap',
    borderRadius: 'sm',
    fontWeight: 'semibold',
    fontSize: 'sm',
    lineHeight: 'tight',
    transitionProperty: 'background-color, color, border-color',
    transitionDuration: 'fast',
    _disabled: { cursor: 'not-allowed', opacity: 0.55 },
  },
  variants: {
    variant: {
      solid: { bg: 'accent.solid', color: 'accent.contrast', px: 4, minH: 10 },
      quiet: {
        borderWidth: '1px',
        borderStyle: 'solid',
        borderColor: 'border.field',
        bg: 'bg.field',
        px: 4,
        minH: 10,
        _hover: { borderColor: 'accent', color: 'accent' },
      },
      plain: {
        color: 'fg.muted',
        fontWeight: 'normal',
        minH: 6,
        _hover: { color: 'accent', textDecoration: 'underline', textUnderlineOffset: '3px' },
        _expanded: { color: 'fg' },
      },
      icon: { color: 'fg.muted', minH: 9, minW: 9, _hover: { color: 'fg', bg: 'bg.hover' } },
    },
  },
  defaultVariants: { variant: 'quiet' },
});
