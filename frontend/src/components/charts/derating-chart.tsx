import { chakra } from '@chakra-ui/react';
import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import { formatQuantityParts } from '@resistry/engineering/notation/format-quantity-parts';
import type { DeratingCurve } from '@resistry/engineering/ratings/ratings';
import { deratingLines } from './derating-lines';
import { LineChart, type Series } from './line-chart';
import { NumbersTable } from './numbers-table';

export interface DeratingChartProps {
  /** W */
  ratedDissipation: number;
  curve: DeratingCurve;
  /** The policy entry in force; absent for the manufacturer's ratings as they are. */
  entry?: PolicyEntry;
  policyName?: string;
  /** What the duty asks: °C on the curve's axis and W. */
  operating?: { from: number; to: number; dissipation: number };
}

const axisWords = { ambient: 'ambient', terminal: 'terminals', case: 'case' } as const;
const coldestDrawn = -55;

/** A prefix for the whole axis, so that its figures stay short. */
function powerUnit(watt: number): { factor: number; unit: string } {
  const { unit } = formatQuantityParts(watt, 'power', { significantDigits: 3 });
  return { factor: unit === 'W' ? 1 : unit === 'mW' ? 1e3 : unit === 'kW' ? 1e-3 : 1e6, unit };
}

const figure = (value: number): string => String(Number(value.toPrecision(3)));
const signed = (value: number): string => (value < 0 ? `\u2212${Math.abs(value)}` : String(value));

/** The derating curve with the policy's line and the point that the duty asks for. */
export function DeratingChart({ ratedDissipation, curve, entry, policyName, operating }: DeratingChartProps) {
  const lines = deratingLines(ratedDissipation, curve, entry, coldestDrawn);
  const { factor, unit } = powerUnit(ratedDissipation);
  const [coldest, hottest] = lines.temperatures;
  const knee = lines.manufacturer[lines.manufacturer.length - 2]?.[0] ?? hottest;
  const series: Series[] = [
    {
      name: 'manufacturer',
      points: lines.manufacturer,
      look: 'plain',
      label: { at: [(knee + hottest) / 2, ratedDissipation * 0.62], anchor: 'middle' },
    },
    ...(lines.policy === undefined
      ? []
      : [
          {
            name: policyName ?? 'policy',
            points: lines.policy,
            look: 'accent-dashed' as const,
            label: {
              at: [coldest + (knee - coldest) * 0.3, lines.policy[0]?.[1] ?? 0] as const,
              anchor: 'middle' as const,
            },
          },
        ]),
  ];
  return (
    <chakra.figure>
      <chakra.figcaption display="flex" justifyContent="space-between" fontSize="2xs" color="fg.muted">
        <b>Derating</b>
        <span>{axisWords[curve.axis]}, °C</span>
      </chakra.figcaption>
      <LineChart
        label={`Derating: ${formatQuantity(ratedDissipation, 'power')} up to ${signed(knee)} °C, nothing left at ${signed(hottest)} °C`}
        x={{
          title: '°C',
          domain: [coldest, hottest],
          ticks: [...new Set([coldest, 0, knee, hottest])],
          format: signed,
        }}
        y={{
          title: unit,
          domain: [0, Math.max(ratedDissipation, operating?.dissipation ?? 0)],
          ticks: [0, 1 / 3, 2 / 3, 1].map((share) => share * ratedDissipation),
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
