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
          {/* What whoever makes the change fills in is no fault of the part. */}
          {demand.field === 'to' || demand.met ? (
            <StatusWord kind="verdict" status={demand.met ? 'met' : 'unmet'} />
          ) : (
            <chakra.span color="fg.muted">asked for</chakra.span>
          )}
          <span>{demand.words}</span>
        </li>
      ))}
    </List>
  );
}
