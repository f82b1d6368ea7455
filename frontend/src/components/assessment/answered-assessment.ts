import type { Assessment, CheckResult } from '@resistry/engineering/assessment/assess';
import type { Basis, BasisInput } from '@resistry/engineering/checks/basis';

/** Where a number stands in a datasheet. */
export interface Citation {
  datasheetId: number;
  /** Document number and revision. */
  datasheet: string;
  page: number;
  note?: string;
}

/** An input of a basis, with its place in a datasheet where the server knows one. */
export type AnsweredInput = BasisInput & { citation?: Citation };

export interface AnsweredBasis extends Omit<Basis, 'inputs'> {
  inputs: readonly AnsweredInput[];
}

export interface AnsweredCheck extends Omit<CheckResult, 'basis'> {
  basis: AnsweredBasis;
}

/** An assessment as the server answers it: with citations, and the policy it was made under. */
export interface AnsweredAssessment extends Omit<Assessment, 'checks' | 'operating'> {
  checks: AnsweredCheck[];
  /** Where self-heating settled: Ω, Ω, W, °C (null where not known). */
  operating?: {
    low: number;
    high: number;
    dissipation: number;
    elementTemperature: number | null;
    steps: number;
  };
  policy: { id: number; version: number; name: string } | 'none' | 'inline';
  /** What stands on every result. */
  notice: string;
}
