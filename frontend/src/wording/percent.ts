const minus = '\u2212';
const narrowSpace = '\u202f';

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
