import { chakra } from '@chakra-ui/react';

/** What a disclosure opens over the page, hung on the edge of its (relatively positioned) parent. */
export const FloatingPanel = chakra('div', {
  base: {
    position: 'absolute',
    top: 'calc(100% + 0.5rem)',
    insetEnd: 0,
    zIndex: 'popover',
    minWidth: '13rem',
    maxWidth: 'calc(100vw - 2rem)',
    bg: 'bg.panel',
    borderWidth: '1px',
    borderStyle: 'solid',
    borderColor: 'border.field',
    borderRadius: 'md',
    py: 2,
    animation: 'appear 120ms ease-out',
  },
});
