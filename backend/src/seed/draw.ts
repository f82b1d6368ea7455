/**
 * A number that looks drawn by lot and is always the same for the same key, whatever else has been drawn before: where
 * the seed data give a rule in place of a tedious list, its variation comes from here.
 *
 * @returns from 0 to below 1
 */
export function draw(key: string): number {
  // FNV-1a over the UTF-16 units, then a finishing mix so that keys that differ in their last letter lie far apart.
  let hash = 0x811c9dc5;
  for (let index = 0; index < key.length; index += 1) {
    hash = Math.imul(hash ^ key.charCodeAt(index), 0x01000193);
  }
  hash = Math.imul(hash ^ (hash >>> 16), 0x85ebca6b);
  hash = Math.imul(hash ^ (hash >>> 13), 0xc2b2ae35);
  return ((hash ^ (hash >>> 16)) >>> 0) / 2 ** 32;
}

/** A whole number from least to most, both included. */
export function drawWhole(key: string, least: number, most: number): number {
  return least + Math.floor(draw(key) * (most - least + 1));
}

/** One of several, by their weights. */
export function drawWeighted<Choice>(
  key: string,
  choices: readonly Choice[],
  weight: (choice: Choice) => number,
): Choice {
  const total = choices.reduce((sum, choice) => sum + weight(choice), 0);
  let rest = draw(key) * total;
  const found = choices.find((choice) => {
    rest -= weight(choice);
    return rest < 0;
  });
  const chosen = found ?? choices.at(-1);
  if (chosen === undefined) throw new RangeError('There is nothing to draw from.');
  return chosen;
}
