import { marginWords, shortfallWords } from './percent';

describe('a shortfall in words', () => {
  it.each([
    [-0.25, '25\u202f% short'],
    // 0.1 % short is shown as 1 %: a shortfall is never shown smaller than it is.
    [-0.001, '1\u202f% short'],
    [-1, undefined],
    [-75, undefined],
  ])('%p is %s', (margin, words) => {
    expect(shortfallWords(margin)).toBe(words);
  });
});

describe('a margin in words', () => {
  it.each([
    [0.58, '+58\u202f%'],
    [0, '+0\u202f%'],
    // 0.329 is shown as 32 %: a margin is never shown larger than it is.
    [0.329, '+32\u202f%'],
    [-0.125, '\u221213\u202f%'],
    [-0.0001, '\u22121\u202f%'],
    [9, '×\u202f10'],
    [13.7, '×\u202f14'],
  ])('%p is %s', (margin, words) => {
    expect(marginWords(margin)).toBe(words);
  });

  it('keeps 0.33 at 33 although its product with 100 falls short of 33 in floating point', () => {
    expect(marginWords(0.29)).toBe('+29\u202f%');
  });
});
