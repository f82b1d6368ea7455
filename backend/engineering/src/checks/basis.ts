import type { CheckUnit } from './check';

/** One number or word that went into a result, and where it comes from. */
export interface BasisInput {
  name: string;
  symbol?: string;
  value: number | string;
  unit?: CheckUnit | 'K/W' | '1/K' | '1/V' | 'h' | 'K' | 'dB';
  from: 'duty' | 'ratings' | 'policy' | 'derived' | 'catalogue';
  /** Field of the ratings, the duty or the policy; a citation is found by it. */
  field?: string;
}

/** Why a number is what it is: words, formula, inputs, source. */
export interface Basis {
  words: string;
  formula?: string;
  inputs: readonly BasisInput[];
  source: string;
  notes: readonly string[];
}

/** The inputs whose value is known; an absent one is left to the list of missing data. */
export function knownInputs(
  ...inputs: readonly (Omit<BasisInput, 'value'> & { value: number | string | undefined })[]
): BasisInput[] {
  return inputs.filter(
    (input): input is BasisInput => input.value !== undefined && !Number.isNaN(input.value),
  );
}
