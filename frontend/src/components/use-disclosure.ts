import { type RefObject, useEffect, useId, useRef, useState } from 'react';

export interface Disclosure<Element extends HTMLElement> {
  open: boolean;
  close: () => void;
  /** Goes on the element that holds both the button and what it opens. */
  rootRef: RefObject<Element | null>;
  buttonProps: {
    ref: RefObject<HTMLButtonElement | null>;
    'aria-expanded': boolean;
    'aria-controls': string;
    onClick: () => void;
  };
  panelId: string;
}

/** A button that shows and hides a panel; Escape, a press outside and leaving by keyboard close it. */
export function useDisclosure<Element extends HTMLElement = HTMLDivElement>(): Disclosure<Element> {
  const [open, setOpen] = useState(false);
  const rootRef = useRef<Element>(null);
  const buttonRef = useRef<HTMLButtonElement>(null);
  const panelId = useId();

  useEffect(() => {
    if (!open) return undefined;
    const leave = (event: Event): void => {
      if (event.target instanceof Node && rootRef.current?.contains(event.target) !== true) setOpen(false);
    };
    const escape = (event: KeyboardEvent): void => {
      if (event.key !== 'Escape') return;
      event.stopPropagation();
      setOpen(false);
      buttonRef.current?.focus();
    };
    document.addEventListener('pointerdown', leave);
    document.addEventListener('focusin', leave);
    document.addEventListener('keydown', escape);
    return () => {
      document.removeEventListener('pointerdown', leave);
      document.removeEventListener('focusin', leave);
      document.removeEventListener('keydown', escape);
    };
  }, [open]);

  return {
    open,
    close: () => setOpen(false),
    rootRef,
    buttonProps: {
      ref: buttonRef,
      'aria-expanded': open,
      'aria-controls': panelId,
      onClick: () => setOpen((before) => !before),
    },
    panelId,
  };
}
