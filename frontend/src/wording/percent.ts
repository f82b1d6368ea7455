const minus = '\u2212';
const narrowSpace = '\u202f';

/**
 * Prints a shortfall as people say it: `12 % short`. A share of the demand that is allowed nothing of, or less than
 * nothing, has no such figure.
 * @param margin allowance / demand − 1, below 0
 * @returns undefined from 100 % short on
 */
export function shortfallWords(margin: number): string | undefined {
  // Rounded up: a shortfall is never shown smaller than it is.
  const percent = Math.ceil(-margin * 100 - 1e-9);
  return percent < 100 ? `${percent}${narrowSpace}% short` : undefined;
}

/**
 * Prints a margin as people say it: `+58 %`, `−12 %`, and from ten times upward as a factor, `× 14`.
 * @param margin allowance / demand − 1
 */
export function marginWords(margin: number): string {
  if (margin >= 9) return `×${narrowSpace}${Math.floor(margin + 1).toLocaleString('en')}`;
  // Rounded towards the unsafe side's opposite: a margin is never shown larger than it is.
  const percent = Math.floor(margin * 100 + 1e-9);
  const sign = percent < 0 ? minus : '+';
  return `${sign}${Math.abs(percent)}${narrowSpace}%`;
}
