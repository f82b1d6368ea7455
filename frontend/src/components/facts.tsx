import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const List = chakra('dl', {
  base: {
    display: 'grid',
    gridTemplateColumns: { base: '1fr', sm: 'minmax(8rem, max-content) minmax(0, 1fr)' },
    columnGap: 6,
    rowGap: { base: 0.5, sm: 1 },
    fontSize: 'sm',
    '& dt': { color: 'fg.muted', mt: { base: 2, sm: 0 } },
  },
});

/** Names with what is so, below each other. */
export function Facts({ facts }: { facts: readonly (readonly [name: string, fact: ReactNode])[] }) {
  return (
    <List>
      {facts.map(([name, fact]) => (
        <chakra.div key={name} display="contents">
          <dt>{name}</dt>
          <dd>{fact}</dd>
        </chakra.div>
      ))}
    </List>
  );
}
