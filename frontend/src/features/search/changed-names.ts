/** The names under which two addresses differ, in order and as one text: what a change was about. */
export function changedNames(before: URLSearchParams, after: URLSearchParams): string {
  const names = new Set([...before.keys(), ...after.keys()]);
  return [...names]
    .filter((name) => before.getAll(name).join('\n') !== after.getAll(name).join('\n'))
    .sort()
    .join(' ');
}
