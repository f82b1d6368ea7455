/** Tolerance letters of IEC 60062 with the symmetrical tolerance as a fraction. */
export const toleranceLetters: ReadonlyMap<string, number> = new Map([
  ['E', 0.00005],
  ['L', 0.0001],
  ['P', 0.0002],
  ['W', 0.0005],
  ['B', 0.001],
  ['C', 0.0025],
  ['D', 0.005],
  ['F', 0.01],
  ['G', 0.02],
  ['J', 0.05],
  ['K', 0.1],
  ['M', 0.2],
]);
