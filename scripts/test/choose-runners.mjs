/**
 * Which runners the words of the command line ask for: all of them, or those after `--only`, comma-separated, with the
 * build first where one of them works on it.
 *
 * @throws Error naming what is not known
 */
export function chooseRunners(words, runners) {
  if (words.length === 0) return runners;
  const [option, names, ...rest] = words;
  if (option !== '--only' || names === undefined || rest.length > 0) {
    throw new Error('Say npm test, or npm test -- --only name,name');
  }
  const wanted = names.split(',');
  const known = runners.map((runner) => runner.name);
  const unknown = wanted.filter((name) => !known.includes(name));
  if (unknown.length > 0) throw new Error(`No runner ${unknown.join(', ')}; there are ${known.join(', ')}`);
  const needsBuild = runners.some((runner) => runner.needsBuild && wanted.includes(runner.name));
  return runners.filter(({ name }) => wanted.includes(name) || (needsBuild && name === 'build'));
}
