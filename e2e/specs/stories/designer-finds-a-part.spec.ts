import { found, results, row } from '../../support/find';
import { expect, test } from '../../support/test';

test('a designer finds and opens a part, and who gets the link sees the same', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto('/find');
  await found(page);
  const everything = await page.getByRole('heading', { level: 1 }).innerText();
  await page.getByRole('textbox', { name: 'Lowest' }).fill('4k5');
  await page.getByRole('textbox', { name: 'Highest' }).fill('4k9');
  await page.getByRole('textbox', { name: 'Voltage' }).first().fill('0..12');
  await page.getByRole('textbox', { name: 'Ambient' }).fill('-20..70');
  await expect(page.getByRole('heading', { level: 1 })).not.toHaveText(everything);
  await found(page);

  await results(page).focus();
  await page.keyboard.press('Enter');
  const sheet = page.getByRole('complementary', { name: 'Assessment' });
  await expect(sheet.getByRole('heading', { level: 2 }).first()).toBeVisible();
  await sheet.getByRole('button', { name: /^Dissipation/ }).click();
  await expect(sheet).toContainText('U²');
  await expect(page).toHaveURL(/upper=4k9.*part=\d+/);

  const { page: other } = await signIn('component-engineer');
  await other.goto(page.url());
  await found(other);
  const shown = async (seen: typeof page): Promise<string[]> => [
    await seen.getByRole('heading', { level: 1 }).innerText(),
    await row(seen, 0).innerText(),
    await row(seen, 5).innerText(),
    await seen.getByRole('complementary', { name: 'Assessment' }).getByRole('heading').first().innerText(),
  ];
  await expect(
    other.getByRole('complementary', { name: 'Assessment' }).getByRole('heading').first(),
  ).toBeVisible();
  expect(await shown(other)).toEqual(await shown(page));
});
