import { wantedApprovals } from '@resistry/engineering/checks/approval';
import { wantedSupply } from '@resistry/engineering/checks/supply';
import type { Requirement } from '@resistry/engineering/duty/requirement';
import type { Relaxation } from '../search-plan';
import { withValueAt } from './relaxable-fields';
import type { Retrial } from './retrial';

/** Loosened choices in the order in which they are offered: the first that brings a unit back is the smallest change. */
export interface Choice {
  pointer: string;
  values: readonly unknown[];
}

/** What can be loosened by allowing one more, or asking one less. A withdrawn part is never offered. */
export function choicesOf(requirement: Requirement): Choice[] {
  const { duty } = requirement;
  const approvals = wantedApprovals(requirement);
  const supply = wantedSupply(requirement);
  const offered: Choice[] = [
    {
      pointer: '/approvals',
      values: (['in-review', 'restricted', 'draft'] as const)
        .filter((name) => !approvals.includes(name))
        .map((name) => [...approvals, name]),
    },
    {
      pointer: '/supply',
      values: (['not-recommended', 'last-time-buy'] as const)
        .filter((name) => !supply.includes(name))
        .map((name) => [...supply, name]),
    },
  ];
  if (duty.secondSource === true) offered.push({ pointer: '/secondSource', values: [false] });
  if (duty.window !== undefined && duty.deviation !== 'root-sum-square') {
    offered.push({ pointer: '/deviation', values: ['root-sum-square'] });
  }
  const { features } = duty;
  if (features !== undefined && features.length > 0) {
    offered.push({
      pointer: '/features',
      values: features.map((left) => features.filter((feature) => feature !== left)),
    });
  }
  return offered;
}

/** The first of the loosened choices that brings units back, and how many. */
export function relaxChoice(
  requirement: Requirement,
  choice: Choice,
  units: readonly number[],
  retrial: Retrial,
): Relaxation | undefined {
  if (units.length === 0) return undefined;
  for (const to of choice.values) {
    const gains = retrial.met(withValueAt(requirement.duty, choice.pointer, to), units).length;
    if (gains > 0) return { field: choice.pointer, to, gains };
  }
  return undefined;
}
