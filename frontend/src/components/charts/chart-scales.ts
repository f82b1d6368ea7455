import { type ScaleContinuousNumeric, scaleLinear, scaleLog } from 'd3-scale';

export interface AxisDefinition {
  /** What is drawn along it, with its unit: "ambient, °C". */
  title: string;
  domain: readonly [number, number];
  logarithmic?: boolean;
  /** Values that get a line and a figure; chosen by the chart, because round is not always what matters. */
  ticks: readonly number[];
  format: (value: number) => string;
}

export type Scale = ScaleContinuousNumeric<number, number>;

export function scaleOf(axis: AxisDefinition, range: readonly [number, number]): Scale {
  return (axis.logarithmic === true ? scaleLog() : scaleLinear()).domain(axis.domain).range(range);
}

/** A few round values from one end to the other. */
export const roundTicks = (from: number, to: number, count: number): number[] =>
  scaleLinear().domain([from, to]).ticks(count);
