import { chakra } from '@chakra-ui/react';
import { StatusWord } from '../../../components/status-word';
import type { Demand } from '../requests/get-transitions';

const List = chakra('ul', {
  base: {
    fontSize: 'sm',
    '& > li': { display: 'grid', gridTemplateColumns: '5.2rem minmax(0, 1fr)', py: 1, columnGap: 2 },
  },
});

/** What a change demands, met or not, as things stand. */
export function DemandList({ demands }: { demands: readonly Demand[] }) {
  if (demands.length === 0) return null;
  return (
    <List aria-label="What it demands">
      {demands.map((demand) => (
        <li key={demand.name}>
          <StatusWord kind="verdict" status={demand.met ? 'met' : 'unmet'} />
          <span>{demand.words}</span>
        </li>
      ))}
    </List>
  );
}
