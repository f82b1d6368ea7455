import { destinationAfterSignIn } from './destination';

describe('the destination after signing in', () => {
  it('is the page that was asked for, with its search', () => {
    expect(destinationAfterSignIn('/find?lower=4k5')).toBe('/find?lower=4k5');
  });

  it.each([
    null,
    '',
    'https://elsewhere.example',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'javascript:0',
    '/sign-in?next=/find',
  ])('is Find instead of %p', (next) => {
    expect(destinationAfterSignIn(next)).toBe('/find');
  });
});
