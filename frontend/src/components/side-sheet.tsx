import { chakra } from '@chakra-ui/react';
import { m } from 'framer-motion';
import { type ReactNode, useEffect, useRef } from 'react';
import { Button } from './button';

export interface SideSheetProps {
  /** Names the region. */
  label: string;
  onClose: () => void;
  children: ReactNode;
}

const Sheet = chakra(m.aside, {
  base: {
    bg: 'bg.panel',
    borderInlineStart: '1px solid',
    borderColor: 'border',
    overflowY: 'auto',
    overscrollBehavior: 'contain',
    px: { base: 4, md: 5 },
    py: 4,
    position: { base: 'fixed', xl: 'relative' },
    insetBlock: { base: 0, xl: 'auto' },
    insetEnd: { base: 0, xl: 'auto' },
    width: { base: '100%', sm: '25.5rem', xl: 'auto' },
    zIndex: { base: 'sheet', xl: 'auto' },
    height: { base: '100dvh', xl: 'full' },
    outline: 'none',
  },
});

/** A sheet beside the list, not over it: the list stays in reach. On small screens it covers it. Escape closes it. */
export function SideSheet({ label, onClose, children }: SideSheetProps) {
  const sheetRef = useRef<HTMLElement>(null);
  useEffect(() => {
    const press = (event: KeyboardEvent): void => {
      if (event.key !== 'Escape' || event.defaultPrevented) return;
      const field = document.activeElement;
      if (field instanceof HTMLInputElement && field.type !== 'checkbox') return;
      onClose();
    };
    document.addEventListener('keydown', press);
    return () => document.removeEventListener('keydown', press);
  }, [onClose]);

  // Where it covers the list, the keyboard goes with it, and back to where it was.
  useEffect(() => {
    const sheet = sheetRef.current;
    const before = document.activeElement;
    if (sheet === null || getComputedStyle(sheet).position !== 'fixed') return undefined;
    sheet.focus({ preventScroll: true });
    return () => {
      if (before instanceof HTMLElement) before.focus({ preventScroll: true });
    };
  }, []);

  return (
    <Sheet
      ref={sheetRef}
      tabIndex={-1}
      aria-label={label}
      initial={{ opacity: 0, x: 16 }}
      animate={{ opacity: 1, x: 0 }}
      transition={{ duration: 0.16, ease: 'easeOut' }}
    >
      <chakra.div position="absolute" top={2} insetEnd={2}>
        <Button variant="icon" aria-label="Close the sheet" onClick={onClose}>
          <chakra.svg viewBox="0 0 12 12" width="0.75rem" height="0.75rem" aria-hidden="true">
            <path d="M1.5 1.5 10.5 10.5M10.5 1.5 1.5 10.5" stroke="currentColor" strokeWidth={1.5} />
          </chakra.svg>
        </Button>
      </chakra.div>
      {children}
    </Sheet>
  );
}
