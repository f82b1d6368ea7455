import { chakra } from '@chakra-ui/react';
import { line } from 'd3-shape';
import type { ReactNode } from 'react';
import { type AxisDefinition, type Scale, scaleOf } from './chart-scales';

export type Point = readonly [number, number];

export type Look = 'plain' | 'accent-dashed' | 'muted-dotted';

export interface Series {
  name: string;
  points: readonly Point[];
  /** Lines differ by dashes as well as by colour, for print and for those who see no difference of colour. */
  look: Look;
}

export interface LineChartProps {
  /** Says what the chart shows, for those who do not see it. */
  label: string;
  x: AxisDefinition;
  y: AxisDefinition;
  series: readonly Series[];
  height?: number;
  /** Drawn beneath the lines, with the scales at hand: an area, an operating point. */
  children?: (scales: { x: Scale; y: Scale }) => ReactNode;
}

const width = 340;
const margin = { top: 16, right: 10, bottom: 22, left: 36 };

export const looks = {
  plain: { color: 'fg', strokeDasharray: undefined, strokeWidth: 1.4 },
  'accent-dashed': { color: 'accent', strokeDasharray: '4 3', strokeWidth: 1.4 },
  'muted-dotted': { color: 'fg.muted', strokeDasharray: '1 3', strokeWidth: 1.6 },
} as const;

/** A few lines over two axes with their units; exact, printable, readable without colour. */
export function LineChart({ label, x, y, series, height = 190, children }: LineChartProps) {
  const scaleX = scaleOf(x, [margin.left, width - margin.right]);
  const scaleY = scaleOf(y, [height - margin.bottom, margin.top]);
  const path = line<Point>(
    (point) => scaleX(point[0]),
    (point) => scaleY(point[1]),
  );
  return (
    <chakra.svg
      role="img"
      aria-label={label}
      viewBox={`0 0 ${width} ${height}`}
      width="full"
      fontSize="10px"
      color="fg.muted"
      css={{ '& text': { fill: 'currentColor' } }}
    >
      {y.ticks.map((tick) => (
        <g key={tick}>
          <chakra.line
            x1={margin.left}
            x2={width - margin.right}
            y1={scaleY(tick)}
            y2={scaleY(tick)}
            color="border"
            stroke="currentColor"
          />
          <text x={margin.left - 5} y={scaleY(tick)} dy="0.34em" textAnchor="end">
            {y.format(tick)}
          </text>
        </g>
      ))}
      {x.ticks.map((tick) => (
        <text key={tick} x={scaleX(tick)} y={height - margin.bottom + 14} textAnchor="middle">
          {x.format(tick)}
        </text>
      ))}
      <text x={margin.left} y={margin.top - 6}>
        {y.title}
      </text>
      {children?.({ x: scaleX, y: scaleY })}
      {series.map(({ name, points, look }) => (
        <chakra.g key={name} color={looks[look].color}>
          <path
            d={path(points) ?? undefined}
            fill="none"
            stroke="currentColor"
            strokeWidth={looks[look].strokeWidth}
            strokeDasharray={looks[look].strokeDasharray}
          />
        </chakra.g>
      ))}
    </chakra.svg>
  );
}
