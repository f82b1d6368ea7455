import { chakra } from '@chakra-ui/react';
import { NavLink } from 'react-router-dom';

/** A place in the navigation; the present one is marked by weight and ink, and by `aria-current`. */
export const NavigationLink = chakra(NavLink, {
  base: {
    color: 'fg.muted',
    textDecoration: 'none',
    py: 1,
    whiteSpace: 'nowrap',
    _hover: { color: 'fg', textDecoration: 'underline', textUnderlineOffset: '4px' },
    '&[aria-current=page]': { color: 'fg', fontWeight: 'semibold' },
  },
});
