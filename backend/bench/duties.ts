import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import type { Duty } from '@resistry/engineering/duty/duty';
import { valuesBetween } from '@resistry/engineering/preferred-values/values-between';

/** A kind of search with the goal for its p95, ms on an idle machine of two cores. */
export interface WindowKind {
  name: string;
  goal: number;
  windowOf(nominal: number): NonNullable<Duty['window']>;
}

export const windowKinds: readonly WindowKind[] = [
  { name: '±1 %', goal: 25, windowOf: (nominal) => ({ lower: nominal * 0.99, upper: nominal * 1.01 }) },
  { name: '±5 %', goal: 35, windowOf: (nominal) => ({ lower: nominal * 0.95, upper: nominal * 1.05 }) },
  {
    name: 'a decade',
    goal: 200,
    windowOf: (nominal) => ({ lower: nominal / Math.sqrt(10), upper: nominal * Math.sqrt(10) }),
  },
  { name: 'whole catalogue', goal: 900, windowOf: () => ({ lower: 1e-6, upper: 1e13 }) },
];

export const loads: readonly { name: string; load: NonNullable<Duty['load']> }[] = [
  { name: '24 V', load: { voltage: { min: 0, max: 24 } } },
  { name: '10 mA', load: { current: { min: 0, max: 0.01 } } },
];

export const policies: readonly { name: string; policy: PolicyEntry }[] = [
  { name: 'parallel', policy: { match: {}, powerRatio: 0.6, reading: 'parallel', voltageRatio: 0.8 } },
  { name: 'multiplied', policy: { match: {}, powerRatio: 0.6, reading: 'multiplied', voltageRatio: 0.8 } },
];

/** Nominal resistances that the searches go through in turn. */
export const nominals = valuesBetween(100, 1e6, 'E6');

export function dutyOf(kind: WindowKind, nominal: number, load: NonNullable<Duty['load']>): Duty {
  return { window: kind.windowOf(nominal), load, ambient: { min: -20, max: 70 }, life: { hours: 50_000 } };
}
