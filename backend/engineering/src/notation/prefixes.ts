/** SI prefixes as they are typed, with their power of ten. `m` is milli and `M` mega, always; `K` is taken for kilo. */
export const typedPrefixes: ReadonlyMap<string, number> = new Map([
  ['f', -15],
  ['p', -12],
  ['n', -9],
  ['\u00b5', -6],
  ['u', -6],
  ['m', -3],
  ['k', 3],
  ['K', 3],
  ['M', 6],
  ['G', 9],
  ['T', 12],
]);

/** SI prefixes as they are printed, with their power of ten; the micro sign is U+00B5. */
export const printedPrefixes: ReadonlyMap<number, string> = new Map([
  [-15, 'f'],
  [-12, 'p'],
  [-9, 'n'],
  [-6, '\u00b5'],
  [-3, 'm'],
  [0, ''],
  [3, 'k'],
  [6, 'M'],
  [9, 'G'],
  [12, 'T'],
]);
