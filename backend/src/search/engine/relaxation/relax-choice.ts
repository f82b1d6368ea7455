import { wantedApprovals } from '@resistry/engineering/checks/approval';
import { wantedSupply } from '@resistry/engineering/checks/supply';
import type { Requirement } from '@resistry/engineering/duty/requirement';
import type { Relaxation } from '../search-plan';
import { withValueAt } from './relaxable-fields';
import type { Retrial } from './retrial';
import type { Units } from './units';

/** Loosened choices in the order in which they are offered: the first that brings a unit back is the smallest change. */
export interface Choice {
  pointer: string;
  values: readonly unknown[];
  /** Whether it changes nothing but what is asked of a part's standing. */
  standingOnly: boolean;
}

/** What can be loosened by allowing one more, or asking one less. A withdrawn part is never offered. */
export function choicesOf(requirement: Requirement): Choice[] {
  const { duty } = requirement;
  const approvals = wantedApprovals(requirement);
  const supply = wantedSupply(requirement);
  const offered: Choice[] = [
    {
      pointer: '/approvals',
      standingOnly: true,
      values: (['in-review', 'restricted', 'draft'] as const)
        .filter((name) => !approvals.includes(name))
        .map((name) => [...approvals, name]),
    },
    {
      pointer: '/supply',
      standingOnly: true,
      values: (['not-recommended', 'last-time-buy'] as const)
        .filter((name) => !supply.includes(name))
        .map((name) => [...supply, name]),
    },
  ];
  if (duty.secondSource === true)
    offered.push({ pointer: '/secondSource', standingOnly: true, values: [false] });
  if (duty.window !== undefined && duty.deviation !== 'root-sum-square') {
    offered.push({ pointer: '/deviation', standingOnly: false, values: ['root-sum-square'] });
  }
  const { features } = duty;
  if (features !== undefined && features.length > 0) {
    offered.push({
      pointer: '/features',
      standingOnly: false,
      values: features.map((left) => features.filter((feature) => feature !== left)),
    });
  }
  return offered;
}

/** The first of the loosened choices that brings units back, and how many. */
export function relaxChoice(
  requirement: Requirement,
  choice: Choice,
  units: Units,
  retrial: Retrial,
): Relaxation | undefined {
  if (units.size === 0) return undefined;
  for (const to of choice.values) {
    const duty = withValueAt(requirement.duty, choice.pointer, to);
    const gains = choice.standingOnly
      ? retrial.countMetByStanding(duty, units)
      : retrial.countMet(duty, units);
    if (gains > 0) return { field: choice.pointer, to, gains };
  }
  return undefined;
}
