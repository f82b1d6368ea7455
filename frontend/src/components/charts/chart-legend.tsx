import { chakra } from '@chakra-ui/react';
import { type Series, looks } from './line-chart';

/** Which line is which, beneath the chart: names in it would cross one line or another. */
export function ChartLegend({ series }: { series: readonly Pick<Series, 'name' | 'look'>[] }) {
  return (
    <chakra.ul display="flex" flexWrap="wrap" columnGap={4} fontSize="2xs" color="fg.muted">
      {series.map(({ name, look }) => (
        <chakra.li key={name} display="inline-flex" alignItems="center" gap={1.5}>
          <chakra.svg width="22px" height="8px" aria-hidden="true" color={looks[look].color}>
            <line
              x1={0}
              x2={22}
              y1={4}
              y2={4}
              stroke="currentColor"
              strokeWidth={looks[look].strokeWidth}
              strokeDasharray={looks[look].strokeDasharray}
            />
          </chakra.svg>
          {name}
        </chakra.li>
      ))}
    </chakra.ul>
  );
}
