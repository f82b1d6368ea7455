/** Words of the scripts themselves, told apart from those of the tools that they run. */
export function say(words) {
  console.log(`» ${words}`);
}

/** @param {number} since a reading of `performance.now()` */
export function secondsSince(since) {
  return `${((performance.now() - since) / 1000).toFixed(1)} s`;
}
