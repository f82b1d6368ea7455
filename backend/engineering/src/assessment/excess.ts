import type { CheckDefinition, CheckName, Finding } from '../checks/check';

/** How many times a rating passes its demand, by check: the sign of over-specification. */
export type Excess = Partial<Record<CheckName, number>>;

/** Checks of which more than needed is paid for; the element temperature follows the dissipation and is left out. */
export const excessChecks: ReadonlySet<CheckName> = new Set([
  'value',
  'dissipation',
  'voltage',
  'insulation',
  'link-current',
]);

/** allowance / demand of the met checks that count; a demand of 0 has no ratio. */
export function excessOf(findings: readonly { definition: CheckDefinition; finding: Finding }[]): Excess {
  const excess: Excess = {};
  for (const { definition, finding } of findings) {
    if (excessChecks.has(definition.name) && finding.status === 'met' && finding.margin !== null) {
      excess[definition.name] = finding.margin + 1;
    }
  }
  return excess;
}

/** One figure to order parts by: the sum of the logarithms of their excesses; 0 where nothing exceeds. */
export function totalExcess(excess: Excess): number {
  return Object.values(excess).reduce((sum, times) => sum + Math.log(times), 0);
}
