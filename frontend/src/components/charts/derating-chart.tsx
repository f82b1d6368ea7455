import { chakra } from '@chakra-ui/react';
import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import { formatQuantityParts } from '@resistry/engineering/notation/format-quantity-parts';
import type { DeratingCurve } from '@resistry/engineering/ratings/ratings';
import { ChartLegend } from './chart-legend';
import { roundTicks } from './chart-scales';
import { deratingLines } from './derating-lines';
import { LineChart, type Series } from './line-chart';
import { NumbersTable } from './numbers-table';

export interface DeratingChartProps {
  /** Where no heading says already what it is. */
  title?: string;
  /** W */
  ratedDissipation: number;
  curve: DeratingCurve;
  /** The policy entry in force; absent for the manufacturer's ratings as they are. */
  entry?: PolicyEntry;
  policyName?: string;
  /** What the duty asks: °C on the curve's axis and W. */
  operating?: { from: number; to: number; dissipation: number };
}

const axisWords = {
  ambient: 'ambient temperature',
  terminal: 'temperature of the terminals',
  case: 'temperature of the case',
} as const;
const coldestDrawn = -55;

/** A prefix for the whole axis, so that its figures stay short. */
function powerUnit(watt: number): { factor: number; unit: string } {
  const { unit } = formatQuantityParts(watt, 'power', { significantDigits: 3 });
  return { factor: unit === 'W' ? 1 : unit === 'mW' ? 1e3 : unit === 'kW' ? 1e-3 : 1e6, unit };
}

const figure = (value: number): string => String(Number(value.toPrecision(3)));
const signed = (value: number): string => (value < 0 ? `\u2212${Math.abs(value)}` : String(value));

/** Ticks in the order of what matters, without those whose figures would touch an earlier one's. */
const apart = (ticks: readonly number[], gap: number): number[] =>
  ticks.reduce<number[]>(
    (kept, tick) => (kept.every((other) => Math.abs(other - tick) >= gap) ? [...kept, tick] : kept),
    [],
  );

/** The derating curve with the policy's line and the point that the duty asks for. */
export function DeratingChart(props: DeratingChartProps) {
  const { title, ratedDissipation, curve, entry, policyName, operating } = props;
  const lines = deratingLines(ratedDissipation, curve, entry, coldestDrawn);
  const { factor, unit } = powerUnit(ratedDissipation);
  const [coldest, hottest] = lines.temperatures;
  const levelTo = lines.levelTo;
  const last = lines.manufacturer[lines.manufacturer.length - 1]?.[1] ?? 0;
  const top = Math.max(ratedDissipation, operating?.dissipation ?? 0);
  const series: Series[] = [
    { name: 'manufacturer', points: lines.manufacturer, look: 'plain' },
    ...(lines.policy === undefined
      ? []
      : [{ name: policyName ?? 'policy', points: lines.policy, look: 'accent-dashed' as const }]),
  ];
  return (
    <chakra.figure>
      <chakra.figcaption display="flex" justifyContent="space-between" fontSize="2xs" color="fg.muted">
        {title !== undefined && <b>{title}</b>}
        <span>over the {axisWords[curve.axis]}, °C</span>
      </chakra.figcaption>
      <LineChart
        label={`Derating: ${formatQuantity(ratedDissipation, 'power')} up to ${signed(levelTo)} °C, ${
          last === 0 ? 'nothing left' : `${formatQuantity(last, 'power', { significantDigits: 3 })} left`
        } at ${signed(hottest)} °C`}
        x={{
          title: '°C',
          domain: [coldest, hottest],
          ticks: apart([coldest, hottest, levelTo, 0], (hottest - coldest) / 12),
          format: signed,
        }}
        y={{
          title: unit,
          domain: [0, top],
          ticks: apart([ratedDissipation, ...roundTicks(0, top, 4)], top / 9),
          format: (watt) => figure(watt * factor),
        }}
        series={series}
      >
        {({ x, y }) =>
          operating !== undefined && (
            <OperatingPoint
              left={x(Math.max(coldest, operating.from))}
              right={x(Math.min(hottest, operating.to))}
              top={y(operating.dissipation)}
              bottom={y(0)}
              words={formatQuantity(operating.dissipation, 'power', { significantDigits: 4 })}
            />
          )
        }
      </LineChart>
      {series.length > 1 && <ChartLegend series={series} />}
      <NumbersTable
        caption="Points of the manufacturer’s curve"
        headers={['°C', unit]}
        rows={lines.manufacturer.map(([celsius, watt]) => [signed(celsius), figure(watt * factor)])}
      />
    </chakra.figure>
  );
}

interface OperatingPointProps {
  left: number;
  right: number;
  top: number;
  bottom: number;
  words: string;
}

/** The duty's field: from the coldest to the hottest, up to the highest dissipation; its corner is what counts. */
function OperatingPoint({ left, right, top, bottom, words }: OperatingPointProps) {
  return (
    <>
      <chakra.rect
        x={left}
        width={Math.max(0, right - left)}
        y={top}
        height={bottom - top}
        fill="accent"
        opacity={0.13}
      />
      <chakra.circle cx={right} cy={top} r={4} fill="accent" />
      <chakra.text x={right - 7} y={top + 13} textAnchor="end" color="fg">
        {words}
      </chakra.text>
    </>
  );
}
