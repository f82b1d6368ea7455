import { isMember } from '@resistry/engineering/preferred-values/is-member';
import { seriesNames, type SeriesName } from '@resistry/engineering/preferred-values/series';

/** One bit a series of preferred values, set where it holds the resistance (Ω); none for a link. */
export function seriesBits(resistance: number): number {
  if (resistance === 0) return 0;
  return seriesNames.reduce(
    (bits, name, position) => (isMember(resistance, name) ? bits | (1 << position) : bits),
    0,
  );
}

/**
 * Bits that a filter by series accepts. Every family offers E24 values at 1 % and tighter too, and E24 is in none of
 * E48, E96 and E192, so those three accept E24 values beside their own (IEC 60063).
 */
export function acceptedSeriesBits(names: readonly SeriesName[]): number {
  const bit = (name: SeriesName): number => 1 << seriesNames.indexOf(name);
  return names.reduce(
    (bits, name) => bits | bit(name) | (['E48', 'E96', 'E192'].includes(name) ? bit('E24') : 0),
    0,
  );
}
