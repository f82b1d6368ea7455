import type { BasisInput } from '@resistry/engineering/checks/basis';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import type { Quantity } from '@resistry/engineering/notation/quantity';

type Unit = NonNullable<BasisInput['unit']>;

/** What is measured in each unit that checks and their inputs bear. */
const quantityOfUnit: Partial<Record<Unit, Quantity>> = {
  '1': 'fraction',
  W: 'power',
  V: 'voltage',
  A: 'current',
  Ω: 'resistance',
  m: 'length',
  '°C': 'temperature',
  K: 'temperature-difference',
  'K/W': 'thermal-resistance',
  '1/K': 'temperature-coefficient',
  '1/V': 'voltage-coefficient',
  dB: 'noise-index',
};

const secondsPerHour = 3600;

/** A value of a check or of its basis in the notation of the trade. */
export function unitWords(value: number | string, unit: Unit | undefined): string {
  if (typeof value === 'string') return value;
  if (!Number.isFinite(value)) return 'without bound';
  if (unit === 'h') return formatQuantity(value * secondsPerHour, 'time', { significantDigits: 5 });
  const quantity = unit === undefined ? undefined : quantityOfUnit[unit];
  return formatQuantity(value, quantity ?? 'ratio', { significantDigits: 4 });
}
