import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { Mounting } from '@resistry/engineering/ratings/technology';
import type { Shortfall } from './shortfall';

/** Resistances that differ by less are the same nominal. */
const SAME_NOMINAL = 1e-9;

/** What says whether a part goes into the place of another. */
export interface Fit {
  /** Ω */
  resistance: number;
  mounting?: Mounting;
  landPattern?: string;
  bodyStyle: string;
  sizeCode: string;
  metricCode?: string;
}

/**
 * In what a part does not fit the place of another: resistance, mounting, and the land pattern or, where one of the two
 * datasheets names none, body style and size code. An absent land pattern on one side only leaves the fit unknown.
 */
export function compareFit(own: Fit, other: Fit): Shortfall[] {
  return [
    ...resistanceShortfall(own, other),
    ...mountingShortfall(own, other),
    ...placeShortfalls(own, other),
  ];
}

function resistanceShortfall(own: Fit, other: Fit): Shortfall[] {
  if (Math.abs(other.resistance - own.resistance) <= own.resistance * SAME_NOMINAL) return [];
  return [
    {
      field: 'resistance',
      sense: 'different',
      own: formatQuantity(own.resistance, 'resistance'),
      alternate: formatQuantity(other.resistance, 'resistance'),
    },
  ];
}

function mountingShortfall(own: Fit, other: Fit): Shortfall[] {
  return differing('mounting', own.mounting, other.mounting);
}

function placeShortfalls(own: Fit, other: Fit): Shortfall[] {
  if (own.landPattern !== undefined && other.landPattern !== undefined) {
    return differing('landPattern', own.landPattern, other.landPattern);
  }
  return [
    ...differing('bodyStyle', own.bodyStyle, other.bodyStyle),
    ...differing('size', sizeWords(own), sizeWords(other)),
    ...differing('landPattern', own.landPattern, other.landPattern),
  ];
}

function sizeWords({ sizeCode, metricCode }: Fit): string {
  return metricCode === undefined ? sizeCode : `${sizeCode} (${metricCode})`;
}

function differing(field: string, own: string | undefined, alternate: string | undefined): Shortfall[] {
  if (own === alternate) return [];
  const sense = own === undefined || alternate === undefined ? 'unknown' : 'different';
  return [{ field, sense, own, alternate }];
}
