import type { Excess } from '@resistry/engineering/assessment/excess';
import type { CheckName } from '@resistry/engineering/checks/check';

/** From how many times its demand a rating is called more than is needed. */
const worthNaming = 3;

const words: Partial<Record<CheckName, (times: string) => string>> = {
  value: (times) => `${times} tighter than needed`,
  dissipation: (times) => `${times} the dissipation`,
  voltage: (times) => `${times} the voltage`,
};

/** Voltage is left aside here: almost every part passes it many times over, and nobody pays for it. */
const named = ['value', 'dissipation'] as const;

/**
 * What a part has far more of than is asked: the sign that something cheaper would do.
 * @returns undefined where nothing passes three times its demand
 */
export function overSpecification(excess: Excess): string | undefined {
  const largest = named
    .map((check) => ({ check, times: excess[check] ?? 0 }))
    .sort((first, second) => second.times - first.times)[0];
  if (largest === undefined || largest.times < worthNaming) return undefined;
  return words[largest.check]?.(`${Math.floor(largest.times)}\u202f×`);
}
