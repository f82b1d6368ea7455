import type { Conditions } from '../operating/conditions';
import type { OperatingState } from '../operating/settle';
import type { Requirement } from '../duty/requirement';
import type { Ratings } from '../ratings/ratings';
import type { Approval, SupplyStatus } from '../ratings/technology';
import type { Basis } from './basis';

export const checkNames = [
  'value',
  'dissipation',
  'element-temperature',
  'voltage',
  'single-pulse',
  'repeated-pulse',
  'pulse-voltage',
  'insulation',
  'category-temperature',
  'noise',
  'frequency',
  'link-current',
  'link-resistance',
  'body',
  'mounting',
  'features',
  'certificate',
  'approval',
  'supply',
  'second-source',
] as const;
export type CheckName = (typeof checkNames)[number];

export type Status = 'met' | 'unmet' | 'unrated';

/** Unit of a check's demand and allowance; '1' is a fraction, '' a yes-or-no check. */
export type CheckUnit = '1' | 'W' | 'V' | '°C' | 'A' | 'Ω' | 'm' | '';

/** How the catalogue stands to a part; absent for a part known only by its numbers. */
export interface Standing {
  approval?: Approval;
  supply?: SupplyStatus;
  /** Another manufacturer's approved or preferred and active part stands under the same company part number. */
  secondSource?: boolean;
}

/** What one check found, without the words. */
export interface Finding {
  demand: number | null;
  allowance: number | null;
  /** allowance / demand − 1; null for yes-or-no checks, for demand 0 and for unrated. */
  margin: number | null;
  status: Status;
  /** Data that are missing for a full answer: fields of the ratings, the duty or the policy. */
  missing: readonly string[];
}

/** What a check is given: the part under its conditions, where it settled, and its standing in the catalogue. */
export interface CheckInput {
  conditions: Conditions;
  state: OperatingState;
  standing?: Standing;
}

/** One check: a new one is a new file of this shape and its line in the list. */
export interface CheckDefinition {
  name: CheckName;
  unit: CheckUnit;
  /** Fields of the duty (JSON pointers) on which its answer can depend. */
  dependsOn: readonly string[];
  /** Whether its answer can change with the resistance inside one range. */
  variesWithResistance: boolean;
  /** Whether the duty asks this of such a part. */
  asked(requirement: Requirement, ratings: Ratings, standing: Standing | undefined): boolean;
  find(input: CheckInput): Finding;
  explain(input: CheckInput, finding: Finding): Basis;
}
