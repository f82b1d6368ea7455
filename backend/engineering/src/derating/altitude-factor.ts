import type { PolicyEntry } from './policy-entry';

/** The factor on dissipation at an altitude, or why it is not known. */
export type AltitudeFactor = { known: true; factor: number } | { known: false; missing: string };

/**
 * Factor by which thinner air lowers the allowed dissipation, from the policy's own table: linear between its points, the
 * first factor below them. Above its last point it is not known rather than continued.
 * @param metre altitude, m; undefined or not above 0 asks for nothing
 * @param entry the policy entry in force; undefined = manufacturer's ratings as they are, factor 1
 */
export function altitudeFactor(entry: PolicyEntry | undefined, metre: number | undefined): AltitudeFactor {
  if (metre === undefined || metre <= 0 || entry === undefined) return { known: true, factor: 1 };
  const table = entry.altitude;
  const first = table?.[0];
  if (table === undefined || first === undefined) {
    return { known: false, missing: 'altitude factors of the derating policy' };
  }
  if (metre <= first[0]) return { known: true, factor: first[1] };
  let before = first;
  for (const point of table.slice(1)) {
    if (metre <= point[0]) {
      const share = (metre - before[0]) / (point[0] - before[0]);
      return { known: true, factor: before[1] + share * (point[1] - before[1]) };
    }
    before = point;
  }
  return { known: false, missing: `an altitude factor of the derating policy above ${String(before[0])} m` };
}
