import * as fc from 'fast-check';
import type { Policy } from '../derating/policy-entry';
import type { Duty } from '../duty/duty';
import { requirementOf } from '../duty/requirement';
import type { Ratings } from '../ratings/ratings';
import { thickFilmChip, twoThirds } from '../test-support/thick-film-chip';
import { assess, type Assessment } from './assess';

const assessed = (ratings: Ratings, duty: Duty, policy: Policy): Assessment =>
  assess({ modes: [{ ratings }] }, requirementOf(duty), policy);

describe('a margin never grows when a demand grows', () => {
  const policies: Policy[] = [
    'none',
    { entries: [twoThirds] },
    { entries: [{ match: {}, powerRatio: 0.6, reading: 'parallel', voltageRatio: 0.8 }] },
  ];
  const ratio = fc.double({ min: 1, max: 4, noNaN: true });
  const duties = fc.record({
    voltage: fc.double({ min: 0.1, max: 300, noNaN: true }),
    current: fc.option(fc.double({ min: 1e-5, max: 0.1, noNaN: true })),
    max: fc.double({ min: 20, max: 150, noNaN: true }),
    hours: fc.double({ min: 10, max: 80_000, noNaN: true }),
    policy: fc.constantFrom(...policies),
    technology: fc.constantFrom<Ratings['technology'][]>('thick-film', 'thin-film'),
    resistance: fc.double({ min: 1, max: 1e7, noNaN: true }),
  });
  const dutyOf = (values: {
    voltage: number;
    current: number | null;
    max: number;
    hours: number;
    resistance: number;
  }): Duty => ({
    window: { lower: values.resistance * 0.9, upper: values.resistance * 1.1 },
    load: {
      voltage: { min: 0, max: values.voltage },
      ...(values.current === null ? {} : { current: { min: 0, max: values.current } }),
    },
    ambient: { min: 0, max: values.max },
    life: { hours: values.hours },
  });
  const rank = { met: 2, unrated: 1, unmet: 0 };

  it.each(['voltage', 'hours', 'max'] as const)('%s', (field) => {
    fc.assert(
      fc.property(duties, ratio, (values, factor) => {
        const ratings: Ratings = {
          ...thickFilmChip,
          technology: values.technology,
          resistance: values.resistance,
        };
        const gentler = assessed(ratings, dutyOf(values), values.policy);
        const harder = assessed(
          ratings,
          dutyOf({ ...values, [field]: values[field] * factor }),
          values.policy,
        );
        for (const line of gentler.checks) {
          const other = harder.checks.find((candidate) => candidate.check === line.check);
          expect(rank[other?.status ?? 'met']).toBeLessThanOrEqual(rank[line.status]);
          if (line.margin === null || other?.margin === null || other === undefined) continue;
          // Relative slack: the fixed point is iterated to 1e-13.
          expect(other.margin).toBeLessThanOrEqual(line.margin + 1e-9 * (1 + Math.abs(line.margin)));
        }
      }),
      { numRuns: 300 },
    );
  });
});
