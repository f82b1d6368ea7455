import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import type { Ratings } from '@resistry/engineering/ratings/ratings';

const secondsPerHour = 3600;

export function driftText({ drift }: Ratings): string | undefined {
  if (drift === undefined) return undefined;
  const hours = formatQuantity(drift.hours * secondsPerHour, 'time');
  const at = formatQuantity(drift.temperature, 'temperature');
  const law =
    drift.law === undefined
      ? ''
      : `; grows by (t/t₀)^${drift.law.exponent}, doubles per ${drift.law.doubling} K`;
  return `${formatQuantity(drift.fraction, 'fraction')} after ${hours} at ${at}${law}`;
}

export function bodyText({ body }: Ratings): string | undefined {
  if (body === undefined) return undefined;
  return [body.length, body.width, body.height].map((side) => formatQuantity(side, 'length')).join(' × ');
}

export function deratingText({ derating }: Ratings): string | undefined {
  if (derating === undefined) return undefined;
  const points = derating.points.map(
    ([celsius, fraction]) =>
      `${formatQuantity(fraction, 'fraction')} at ${formatQuantity(celsius, 'temperature')}`,
  );
  const axis = { ambient: 'ambient', terminal: 'at the terminals', case: 'of the case' }[derating.axis];
  return `${points.join(', ')} (${axis})`;
}

/** Points of (s, `quantity` in SI): `33 W for 1 µs, 17.4 W for 10 µs`. */
function pointsText(points: readonly (readonly [number, number])[], quantity: Quantity): string {
  return points
    .map(([seconds, value]) => `${formatQuantity(value, quantity)} for ${formatQuantity(seconds, 'time')}`)
    .join(', ');
}

export function singlePulsesText({ pulses }: Ratings): string | undefined {
  if (pulses?.single === undefined) return undefined;
  const count =
    pulses.singleCount === undefined ? '' : `; up to ${pulses.singleCount.toLocaleString('en')} pulses`;
  return pointsText(pulses.single, 'power') + count;
}

export const repeatedPulsesText = ({ pulses }: Ratings): string | undefined =>
  pulses?.continuous && pointsText(pulses.continuous, 'power');

export function pulseVoltageText({ pulses }: Ratings): string | undefined {
  const voltage = pulses?.voltage;
  if (voltage === undefined) return undefined;
  return typeof voltage === 'number' ? formatQuantity(voltage, 'voltage') : pointsText(voltage, 'voltage');
}
