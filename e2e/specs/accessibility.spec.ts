import type { Page } from '@playwright/test';
import { expectAccessible } from '../support/accessibility';
import { DIVIDER, found, results } from '../support/find';
import { ROLES } from '../support/people';
import { ready } from '../support/ready';
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

for (const colorScheme of SCHEMES) {
  /** A place that several roles have looks the same to all of them: once is enough. */
  const seen = new Set<string>();

  for (const role of ROLES) {
    test(`every place of the ${role} is accessible, ${colorScheme}`, async ({ signIn }) => {
      const { page } = await signIn(role, { colorScheme, reducedMotion: 'reduce' });
      await page.goto('/find');
      await ready(page);
      for (const address of [...(await placesOf(page)), '/account']) {
        if (seen.has(address)) continue;
        seen.add(address);
        await page.goto(address);
        await ready(page);
        await expectAccessible(page);
      }
    });
  }

  test(`a part, its assessment and the change of its standing are accessible, ${colorScheme}`, async ({
    signIn,
  }) => {
    const { page } = await signIn('component-engineer', { colorScheme, reducedMotion: 'reduce' });
    await page.goto(DIVIDER);
    await found(page);
    await results(page).focus();
    await page.keyboard.press('Enter');
    const sheet = page.getByRole('complementary', { name: 'Assessment' });
    await sheet.getByRole('button', { name: /^Dissipation/ }).click();
    await expectAccessible(page);
    await sheet.getByRole('link', { name: 'Ratings, offers and history' }).click();
    await expect(page.getByRole('region', { name: 'What may become of it' })).toBeVisible();
    await ready(page);
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Restrict' }).click();
    await expect(page.getByRole('dialog')).toBeVisible();
    await expectAccessible(page);
  });

  test(`a family is accessible, ${colorScheme}`, async ({ signIn }) => {
    const { page } = await signIn('librarian', { colorScheme, reducedMotion: 'reduce' });
    await page.goto('/families');
    await ready(page);
    await page.getByRole('main').getByRole('link').first().click();
    await expect(page).toHaveURL(/\/families\/\d+/);
    await ready(page);
    await expectAccessible(page);
  });

  test(`the pages before the sign-in are accessible, ${colorScheme}`, async ({ openContext }) => {
    const page = await (await openContext({ colorScheme, reducedMotion: 'reduce' })).newPage();
    for (const address of [
      '/sign-in',
      '/forgotten-password',
      '/reset-password',
      '/reset-password#token=whole',
      '/accept-invitation',
    ]) {
      await page.goto(address);
      await ready(page);
      await expectAccessible(page);
    }
  });
}
