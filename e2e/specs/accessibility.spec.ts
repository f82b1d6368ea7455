import type { Page } from '@playwright/test';
import { expectAccessible } from '../support/accessibility';
import { ROLES } from '../support/people';
import { expect, test } from '../support/test';

const SCHEMES = ['light', 'dark'] as const;

/** Addresses of everything in the navigation of the person signed in, with what lies under Administration. */
async function placesOf(page: Page): Promise<string[]> {
  const navigation = page.getByRole('navigation', { name: 'Places' });
  await expect(navigation).toBeVisible();
  const administration = navigation.getByRole('button', { name: 'Administration' });
  if (await administration.isVisible()) await administration.click();
  const links = await navigation.getByRole('link').all();
  const addresses = await Promise.all(links.map((link) => link.getAttribute('href')));
  return addresses.filter((address) => address !== null);
}

/** A page is ready when its heading stands and nothing on it is still on its way. */
async function ready(page: Page): Promise<void> {
  const heading = page.getByRole('heading', { level: 1 });
  await expect(heading).toBeVisible();
  expect(await heading.innerText(), page.url()).not.toBe('Nothing is here');
  await expect(page.locator('[aria-busy=true]')).toHaveCount(0);
}

for (const colorScheme of SCHEMES) {
  for (const role of ROLES) {
    test(`every place of the ${role} is accessible, ${colorScheme}`, async ({ signIn }) => {
      const { page } = await signIn(role, { colorScheme, reducedMotion: 'reduce' });
      await page.goto('/find');
      await ready(page);
      for (const address of [...(await placesOf(page)), '/account']) {
        await page.goto(address);
        await ready(page);
        await expectAccessible(page);
      }
    });
  }

  test(`the pages before the sign-in are accessible, ${colorScheme}`, async ({ openContext }) => {
    const page = await (await openContext({ colorScheme, reducedMotion: 'reduce' })).newPage();
    for (const address of ['/sign-in', '/forgotten-password', '/reset-password', '/accept-invitation']) {
      await page.goto(address);
      await ready(page);
      await expectAccessible(page);
    }
  });
}
