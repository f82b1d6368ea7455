import { ROLES, personWith } from '../support/people';
import { expect, test } from '../support/test';

for (const role of ROLES) {
  test(`${role} signs in and finds parts`, async ({ openContext }) => {
    const page = await (await openContext()).newPage();
    const { email, password, name } = personWith(role);
    await page.goto('/');
    await page.getByRole('textbox', { name: 'E-mail' }).fill(email);
    await page.getByLabel('Password').fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expect(page.getByRole('button', { name })).toBeVisible();
    await expect(page.getByRole('heading', { level: 1 })).toHaveText(/\d parts meet it$/);
    await expect(page.getByRole('grid').getByRole('row').nth(1)).toBeVisible();
  });
}

test('a wrong password is refused in words, and what was entered stays', async ({ openContext }) => {
  const page = await (await openContext()).newPage();
  await page.goto('/sign-in');
  await page.getByRole('textbox', { name: 'E-mail' }).fill('nobody@brackwater.example.com');
  await page.getByLabel('Password').fill('not the password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert')).toBeVisible();
  await expect(page.getByRole('textbox', { name: 'E-mail' })).toHaveValue('nobody@brackwater.example.com');
});
