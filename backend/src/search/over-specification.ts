import type { Excess } from '@resistry/engineering/assessment/excess';
import type { CheckName } from '@resistry/engineering/checks/check';

/** From how many times its demand on a rating is called more than needed; a factor of two is common practice as reserve. */
const named = 3;

/** The voltage a body bears comes with its size and is left out: naming it would name nearly every part. */
const words: Partial<Record<CheckName, (times: string) => string>> = {
  value: (times) => `${times} × tighter than the window needs`,
  dissipation: (times) => `${times} × the dissipation`,
  insulation: (times) => `${times} × the insulation voltage`,
  'link-current': (times) => `${times} × the current`,
};

/** Over-specification of a part, named, the largest first. */
export function overSpecificationOf(excess: Excess): string[] {
  return Object.entries(excess)
    .filter(([, times]) => times >= named)
    .sort(([, first], [, second]) => second - first)
    .map(([check, times]) => words[check as CheckName]?.(times >= 10 ? times.toFixed(0) : times.toFixed(1)))
    .filter((text) => text !== undefined);
}
