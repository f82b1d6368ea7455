import { changedNames } from './changed-names';

const between = (before: string, after: string): string =>
  changedNames(new URLSearchParams(before), new URLSearchParams(after));

describe('what a change of the address was about', () => {
  it.each([
    ['lower=4k5', 'lower=4k6', 'lower'],
    ['lower=4k5', 'lower=4k5&upper=4k9', 'upper'],
    ['lower=4k5&part=3', 'lower=4k5', 'part'],
    ['upper=4k9&lower=4k5', 'lower=4k&upper=5k', 'lower upper'],
    ['lower=4k5&upper=4k9', 'upper=4k9&lower=4k5', ''],
    ['pulse=a&pulse=b', 'pulse=a', 'pulse'],
  ])('%s → %s: %j', (before, after, names) => {
    expect(between(before, after)).toBe(names);
  });
});
