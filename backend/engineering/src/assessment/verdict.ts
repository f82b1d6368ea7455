import type { Status } from '../checks/check';

/** The verdict over checks: unmet if any is unmet, else unrated if any is, else met. */
export function verdictOf(statuses: readonly Status[]): Status {
  if (statuses.includes('unmet')) return 'unmet';
  return statuses.includes('unrated') ? 'unrated' : 'met';
}

const rank: Record<Status, number> = { met: 0, unrated: 1, unmet: 2 };

/** Negative where the first verdict is the better one. */
export function compareVerdicts(first: Status, second: Status): number {
  return rank[first] - rank[second];
}
