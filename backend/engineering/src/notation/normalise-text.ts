const spaces = /[\s\u00a0\u2000-\u200a\u202f\u205f\u3000]+/g;

/**
 * Brings the many ways to type one sign to a single one: every kind of space to one plain space, the minus signs to "-",
 * the ohm sign U+2126 to the Greek letter, the Greek mu to the micro sign, degree look-alikes to "°".
 * Superscripts and fractions are left as they are: folding "10²" to "102" would turn a power into a wrong number.
 */
export function normaliseText(text: string): string {
  return text
    .replace(spaces, ' ')
    .replace(/[\u2212\ufe63\uff0d\u2010\u2011]/g, '-')
    .replace(/\u2126/g, '\u03a9')
    .replace(/\u03bc/g, '\u00b5')
    .replace(/\u2103/g, '°C')
    .replace(/[\u00ba\u02da]/g, '°')
    .replace(/\+\/-|\+-/g, '±')
    .trim();
}
