import { DIVIDER, EVERYTHING, found, results } from '../support/find';
import { expect, test } from '../support/test';

const NARROW = { width: 390, height: 844 };
/** Wide enough for the table, too narrow for all of its columns. */
const CRAMPED = { width: 1180, height: 900 };

for (const viewport of [{ width: 1440, height: 900 }, NARROW]) {
  test(`the row with the keyboard lies clear of the head, ${viewport.width} px`, async ({ signIn }) => {
    const { page } = await signIn('designer', { viewport });
    await page.goto(EVERYTHING);
    await found(page);
    const grid = results(page);
    await grid.focus();
    for (const keys of [
      Array<string>(25).fill('j'),
      Array<string>(25).fill('k'),
      ['Control+End', 'PageUp'],
    ]) {
      for (const key of keys) await page.keyboard.press(key);
      const overlap = await grid.evaluate((table) => {
        const row = table.querySelector('tr[data-active]')?.getBoundingClientRect();
        const head = table.querySelector('thead')?.getBoundingClientRect();
        return row && head ? head.bottom - row.top : undefined;
      });
      expect(overlap, keys.at(-1)).toBeLessThanOrEqual(0.5);
    }
  });
}

test('back takes the last change away, and forward makes it again', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(DIVIDER);
  await found(page);
  const highest = page.getByRole('textbox', { name: 'Highest' });
  await highest.fill('5k1');
  await expect(page).toHaveURL(/upper=5k1/);
  await results(page).focus();
  await page.keyboard.press('Enter');
  const sheet = page.getByRole('complementary', { name: 'Assessment' });
  await expect(sheet).toBeVisible();
  await expect(page).toHaveURL(/part=\d+/);
  await page.goBack();
  await expect(sheet).toBeHidden();
  await expect(highest).toHaveValue('5k1');
  await page.goBack();
  await expect(highest).toHaveValue('4k9');
  await page.goForward();
  await expect(highest).toHaveValue('5k1');
  await found(page);
});

test('half a number is not called a contradiction while it is being typed', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(DIVIDER);
  await found(page);
  const refusal = page.getByRole('heading', { name: 'The duty contradicts itself' });
  const heading = page.getByRole('heading', { level: 1 });
  const before = await heading.innerText();
  await page.getByRole('textbox', { name: 'Highest' }).fill('5');
  await page.waitForResponse((answer) => answer.status() === 422);
  await expect(refusal).toBeHidden();
  await expect(heading).toHaveText(before);
  // Left at that, it is one.
  await expect(refusal).toBeVisible();
  await page.getByRole('textbox', { name: 'Highest' }).fill('5k1');
  await found(page);
  await expect(refusal).toBeHidden();
});

test('a wide table scrolls sideways beneath the part’s number, and the page stays', async ({ signIn }) => {
  const { page } = await signIn('designer', { viewport: CRAMPED });
  await page.goto(DIVIDER);
  await found(page);
  await page.getByRole('button', { name: 'Columns' }).click();
  for (const name of ['Technology', 'Rated', 'Supply', 'Second source'])
    await page.getByRole('checkbox', { name, exact: true }).check();
  await page.keyboard.press('Escape');
  const heading = page.getByRole('heading', { level: 1 });
  const before = await heading.boundingBox();
  await results(page).focus();
  await page.keyboard.press('End');
  const price = results(page).getByRole('columnheader', { name: '€/1,000' });
  await expect(price).toBeInViewport({ ratio: 1 });
  await expect(results(page).getByRole('columnheader', { name: 'Part', exact: true })).toBeInViewport({
    ratio: 1,
  });
  await expect(results(page).getByRole('columnheader', { name: 'Body' })).not.toBeInViewport();
  expect((await heading.boundingBox())?.x).toBe(before?.x);
});

test('rows that do not come are said to be missing, and asked for again', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(EVERYTHING);
  await found(page);
  await page.route('**/api/parts/search', (route) =>
    route.fulfill({ status: 500, contentType: 'application/problem+json', body: '{}' }),
  );
  await results(page).focus();
  await page.keyboard.press('Control+End');
  const failure = page.getByRole('alert');
  await expect(failure).toBeVisible();
  await page.unroute('**/api/parts/search');
  await failure.getByRole('button', { name: 'Try again' }).click();
  await expect(failure).toBeHidden();
  await expect(results(page).getByRole('row').last()).toContainText(/Ω|link/);
});

test('a sheet that covers the list takes the keyboard and gives it back', async ({ signIn }) => {
  const { page } = await signIn('designer', { viewport: NARROW });
  await page.goto(DIVIDER);
  await found(page);
  await results(page).focus();
  await page.keyboard.press('Enter');
  const sheet = page.getByRole('complementary', { name: 'Assessment' });
  await expect(sheet).toBeFocused();
  await page.keyboard.press('Escape');
  await expect(sheet).toBeHidden();
  await expect(results(page)).toBeFocused();
});

test('who comes back from a part finds the list as they left it', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(EVERYTHING);
  await found(page);
  const scrolled = () =>
    results(page).evaluate((table) => {
      let scroller: Element | null = table;
      while (scroller !== null && getComputedStyle(scroller).overflowY !== 'auto')
        scroller = scroller.parentElement;
      return scroller?.scrollTop;
    });
  await results(page).focus();
  for (let each = 0; each < 6; each += 1) await page.keyboard.press('PageDown');
  await expect(results(page).locator('tr[data-active]')).toContainText(/Ω|link/);
  await page.keyboard.press('Enter');
  const sheet = page.getByRole('complementary', { name: 'Assessment' });
  const before = await scrolled();
  expect(before).toBeGreaterThan(1000);
  await sheet.getByRole('link', { name: 'Ratings, offers and history' }).click();
  await expect(page).toHaveURL(/\/parts\/\d+/);
  await page.goBack();
  await expect(sheet).toBeVisible();
  await expect.poll(scrolled).toBe(before);
});

test('a link to an open part marks its row', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(DIVIDER);
  await found(page);
  await results(page).focus();
  await page.keyboard.press('j');
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/part=\d+/);
  await page.reload();
  await found(page);
  await expect(results(page).getByRole('row', { selected: true })).toHaveAttribute('aria-rowindex', '3');
});
