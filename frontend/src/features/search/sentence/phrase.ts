import { chakra } from '@chakra-ui/react';

/** How a part of the sentence looks that can be changed. */
export const phrase = {
  fontWeight: 'semibold',
  textDecoration: 'underline 2px',
  textDecorationColor: 'accent',
  textUnderlineOffset: '5px',
  display: 'inline',
  lineHeight: 'inherit',
  textAlign: 'start',
  whiteSpace: 'normal',
  _hover: { color: 'accent' },
} as const;

export const PhraseButton = chakra('button', { base: phrase });
