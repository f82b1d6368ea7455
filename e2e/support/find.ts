import { type Locator, type Page, expect } from '@playwright/test';

/** A divider's lower resistor as a designer states it: most of the examples look for it. */
export const DIVIDER = '/find?lower=4k5&upper=4k9&voltage=0..12&ambient=-20..70&life=10+years';

/** Everything in the catalogue, whatever its approval or supply: the longest list there is. */
export const EVERYTHING =
  '/find?approval=draft,in-review,approved,preferred,restricted,withdrawn' +
  '&supply=active,not-recommended,last-time-buy,discontinued&show=met-and-unrated';

export const results = (page: Page): Locator => page.getByRole('grid');

/** The rows that hold a part; the first row of a grid is its head. */
export const row = (page: Page, place: number): Locator =>
  results(page)
    .getByRole('row')
    .nth(place + 1);

/** Waits until the answer to what stands in the address is shown. */
export async function found(page: Page): Promise<void> {
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(/^[\d,]+ (parts?|numbers?) meets? it$/);
  await expect(page.locator('main [aria-busy=true]')).toHaveCount(0);
}
