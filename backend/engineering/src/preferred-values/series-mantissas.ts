import type { SeriesName } from './series';

const e3 = [100, 220, 470];
const e6 = [100, 150, 220, 330, 470, 680];
const e12 = [100, 120, 150, 180, 220, 270, 330, 390, 470, 560, 680, 820];
// A table in the standard: rounding 10^(n/24) would give other values at 2.7 3.0 3.3 3.6 3.9 4.3 4.7 8.2.
const e24 = [
  100, 110, 120, 130, 150, 160, 180, 200, 220, 240, 270, 300, 330, 360, 390, 430, 470, 510, 560, 620, 680,
  750, 820, 910,
];

const mantissas: Readonly<Record<SeriesName, readonly number[]>> = {
  E3: e3,
  E6: e6,
  E12: e12,
  E24: e24,
  E48: geometric(48),
  E96: geometric(96),
  E192: geometric(192),
};

/**
 * The values of one decade as whole hundredths: 100, 105, … stand for 1.00, 1.05, … (IEC 60063).
 * Whole numbers, so that values can be built and compared exactly.
 *
 * @returns ascending, from 100 to below 1000
 */
export function seriesMantissas(series: SeriesName): readonly number[] {
  return mantissas[series];
}

function geometric(steps: number): readonly number[] {
  return Array.from({ length: steps }, (_, step) => {
    // The one exception of the standard: E192 has 9.20 where the formula gives 9.19.
    if (steps === 192 && step === 185) return 920;
    return Math.round(100 * 10 ** (step / steps));
  });
}
