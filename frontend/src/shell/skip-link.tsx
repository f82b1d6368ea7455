import { chakra } from '@chakra-ui/react';

export const contentId = 'content';

export function SkipLink() {
  return (
    <chakra.a
      href={`#${contentId}`}
      position="absolute"
      insetStart={3}
      top="-4rem"
      zIndex="skip"
      bg="bg.panel"
      color="accent"
      px={4}
      py={2}
      borderRadius="sm"
      _focusVisible={{ top: 2 }}
    >
      To the content
    </chakra.a>
  );
}
