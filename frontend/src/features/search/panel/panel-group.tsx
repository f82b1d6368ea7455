import { chakra } from '@chakra-ui/react';
import { type ReactNode, useDeferredValue, useEffect, useRef } from 'react';

const Group = chakra('section', {
  base: {
    display: 'grid',
    gap: 1.5,
    mb: 6,
    '& > header': {
      display: 'flex',
      justifyContent: 'space-between',
      alignItems: 'baseline',
      mb: 0.5,
      fontSize: '2xs',
      color: 'fg.muted',
    },
  },
});

/** A group of the duty that is always open: what most positions need. */
export function OpenGroup({ title, note, children }: { title: string; note?: string; children: ReactNode }) {
  return (
    <Group aria-label={title}>
      <header>
        <h2>{title}</h2>
        {note !== undefined && <span>{note}</span>}
      </header>
      {children}
    </Group>
  );
}

const Folded = chakra('details', {
  base: {
    borderTop: '1px solid',
    borderColor: 'border',
    '& > summary': {
      display: 'flex',
      justifyContent: 'space-between',
      alignItems: 'baseline',
      gap: 3,
      py: 1.5,
      minHeight: 8,
      cursor: 'pointer',
      fontSize: 'sm',
      listStyle: 'none',
    },
    '& > summary::-webkit-details-marker': { display: 'none' },
    '& > summary:hover': { color: 'accent' },
    '& > summary > b': { fontWeight: 'semibold' },
    '& > summary > span': { color: 'fg.muted', textAlign: 'end' },
    '&[open] > summary > span': { visibility: 'hidden' },
    '& > div': { display: 'grid', gap: 1.5, pb: 4 },
  },
});

export interface FoldedGroupProps {
  title: string;
  /** What it holds while it is folded. */
  summary: string;
  /** Something in it cannot be read: it opens by itself. */
  wrong?: boolean;
  children: ReactNode;
}

/** A group of the duty that is rarely needed: folded to its title and what it holds. */
export function FoldedGroup({ title, summary, wrong = false, children }: FoldedGroupProps) {
  const groupRef = useRef<HTMLDetailsElement>(null);
  // What is folded away comes after what is in sight.
  const drawn = useDeferredValue(true, false);
  // Opened from outside React's view of it, so that mending the entry does not fold the group under one's hands.
  useEffect(() => {
    if (wrong && groupRef.current !== null) groupRef.current.open = true;
  }, [wrong]);
  return (
    <Folded ref={groupRef}>
      <summary>
        <b>{title}</b>
        <span>{summary}</span>
      </summary>
      <div>{(drawn || wrong) && children}</div>
    </Folded>
  );
}
