import { hasPulses, type Conditions } from '../operating/conditions';
import type { OperatingState } from '../operating/settle';
import { budgetOf } from '../budget/budget';
import { driftAt } from '../deviation/drift';
import type { Window } from '../duty/window';
import { formatQuantity } from '../notation/format-quantity';
import { knownInputs } from './basis';
import type { CheckDefinition, Finding } from './check';
import { beyondBounds, compared, holds, notComputed, unrated, yesOrNo } from './finding';

/** Distance from a nominal resistance (Ω) to the nearer edge of the window, as a fraction of the nominal. */
export function distanceToEdge(window: Window, nominal: number): number {
  return Math.min((window.upper - nominal) / nominal, (nominal - window.lower) / nominal);
}

const nothing: readonly string[] = [];

/** Data without which the deviation budget cannot pass a part: tolerance, TCR with an ambient, drift with a life. */
export function missingForValue(conditions: Conditions, state: OperatingState): readonly string[] {
  const missing = missingForBudget(conditions, state);
  return hasPulses(conditions.requirement) ? [...missing, notComputed('self-heating by pulses')] : missing;
}

function missingForBudget(conditions: Conditions, state: OperatingState): readonly string[] {
  const { ratings, requirement } = conditions;
  const temperature = requirement.duty.ambient !== undefined;
  const life = requirement.duty.life !== undefined;
  const complete =
    ratings.tolerance !== undefined &&
    (!temperature || ratings.tcr !== undefined) &&
    (!(temperature || life) || !Number.isNaN(state.hot)) &&
    (!life ||
      (conditions.driftOverLife !== undefined && driftAt(conditions.driftOverLife, state.hot).complete));
  if (complete) return nothing;
  const essential = new Set(['tolerance', 'temperature', 'drift']);
  return budgetOf(conditions, state)
    .filter((line) => line.amount === null && essential.has(line.contribution))
    .flatMap((line) => line.missing);
}

export const valueCheck: CheckDefinition = {
  name: 'value',
  unit: '1',
  dependsOn: [
    '/window',
    '/limits',
    '/load',
    '/ambient/min',
    '/ambient/max',
    '/ambient/enclosureRise',
    '/ambient/terminal',
    '/ambient/case',
    '/life/hours',
    '/deviation',
  ],
  variesWithResistance: true,
  asked: (requirement) => requirement.window !== undefined,
  find({ conditions, state }): Finding {
    const { requirement, ratings } = conditions;
    const isLink = ratings.resistance === 0;
    const window = requirement.window;
    if (window === undefined) return unrated(['window']);
    if (requirement.link || isLink) return yesOrNo(requirement.link && isLink);
    const allowance = distanceToEdge(window, state.nominal);
    if (!Number.isFinite(allowance)) return unrated(['window.upper'], state.deviation);
    if (!state.settled) return beyondBounds(allowance);
    if (!holds(state.deviation, allowance)) return compared(state.deviation, allowance);
    const missing = missingForValue(conditions, state);
    return missing.length > 0
      ? unrated(missing, state.deviation, allowance)
      : compared(state.deviation, allowance);
  },
  explain({ conditions, state }, finding) {
    const window = conditions.requirement.window;
    const others = budgetOf(conditions, state).filter((line) => line.amount === null);
    const notes = others.map(
      (line) => `${line.contribution} is not included: ${line.missing.join(', ')} missing.`,
    );
    if (!state.settled)
      notes.push(
        'Self-heating does not settle: each round of deviation and dissipation is larger than the one before.',
      );
    if (finding.status === 'met' && others.length > 0) notes.push('The budget is incomplete.');
    const rule = conditions.rootSumSquare
      ? 'root of the sum of squares'
      : 'sum of the magnitudes (worst case)';
    return {
      words: `Deviation over life, ${rule}, against the distance from the nominal to the nearer edge of the window.`,
      formula: 'Σ|ΔR/R| ≤ min(R_upper − R, R − R_lower) / R',
      inputs: knownInputs(
        {
          name: 'nominal resistance',
          symbol: 'R',
          value: conditions.ratings.resistance,
          unit: 'Ω',
          from: 'ratings',
          field: 'resistance',
        },
        {
          name: 'lowest allowed resistance',
          symbol: 'R_lower',
          value: window?.lower,
          unit: 'Ω',
          from: 'duty',
          field: 'window.lower',
        },
        {
          name: 'highest allowed resistance',
          symbol: 'R_upper',
          value: window?.upper === Infinity ? undefined : window?.upper,
          unit: 'Ω',
          from: 'duty',
          field: 'window.upper',
        },
        {
          name: 'resistance over life',
          value: `${formatQuantity(state.low, 'resistance', { significantDigits: 5 })} … ${formatQuantity(state.high, 'resistance', { significantDigits: 5 })}`,
          from: 'derived',
        },
      ),
      source:
        'IEC 60115-1 for the meaning of each contribution; worst case and root-sum-square as handbooks of tolerance analysis use them',
      notes,
    };
  },
};
