import { defineRecipe } from '@chakra-ui/react';

const field = {
  width: '100%',
  minWidth: 0,
  bg: 'bg.field',
  borderWidth: '1px',
  borderStyle: 'solid',
  borderColor: 'border.field',
  borderRadius: 'sm',
  fontSize: 'sm',
  _invalid: { borderColor: 'unmet' },
  _focusVisible: {
    outline: '2px solid',
    outlineColor: 'accent.focusRing',
    outlineOffset: '-1px',
    borderColor: 'accent',
  },
  _disabled: { opacity: 0.6, cursor: 'not-allowed' },
} as const;

export const inputRecipe = defineRecipe({
  className: 'input',
  base: { ...field, height: '1.875rem', px: 2 },
  variants: { size: { dense: {}, form: { height: 10, px: 3, fontSize: 'md' } } },
  defaultVariants: { size: 'dense' },
});

export const textareaRecipe = defineRecipe({
  className: 'textarea',
  base: { ...field, px: 3, py: 2, minHeight: 20, resize: 'vertical', fontSize: 'md', lineHeight: 'text' },
});
