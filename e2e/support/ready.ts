import { type Page, expect } from '@playwright/test';

/** A page is ready when its heading stands and nothing on it is still on its way. */
export async function ready(page: Page): Promise<void> {
  const heading = page.getByRole('heading', { level: 1 });
  await expect(heading).toBeVisible();
  // Bars stand where lines will be; the words beside them are for screen readers.
  const waiting = page.getByRole('status').filter({ has: page.locator('[aria-hidden=true]') });
  await expect(waiting).toHaveCount(0);
  await expect(page.locator('main [aria-busy=true]')).toHaveCount(0);
  expect.soft(await heading.innerText(), page.url()).not.toBe('Nothing is here');
}
