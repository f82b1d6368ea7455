import { tokenOfFragment } from './fragment-token';

describe('the token of a link in a letter', () => {
  it.each([
    ['#token=abc-123', 'abc-123'],
    ['#token=a%2Bb', 'a+b'],
    ['', ''],
    ['#other=1', ''],
  ])('of %p is %p', (hash, token) => {
    expect(tokenOfFragment(hash)).toBe(token);
  });
});
