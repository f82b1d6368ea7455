import { ask } from '../../support/requests';
import { expect, test } from '../../support/test';

/** An account of the demonstration whose password nobody knows. */
const EMAIL = 'oskar.lindeqvam@brackwater.example.com';

test('somebody who forgot the password chooses a new one by the link in the mail', async ({
  openContext,
  signIn,
}) => {
  const page = await (await openContext()).newPage();
  await page.goto('/sign-in');
  await page.getByRole('link', { name: /forgot/i }).click();
  await page.getByRole('textbox', { name: 'E-mail' }).fill(EMAIL);
  await page.getByRole('button', { name: 'Send the link' }).click();
  await expect(page.getByRole('heading', { name: 'Look into your mail' })).toBeVisible();

  const administrator = await signIn('administrator');
  const link = await test.step('the letter arrives', async () => {
    let found = '';
    await expect(async () => {
      const box = await ask(administrator, 'GET', '/api/mail');
      const { items } = (await box.json()) as { items: { id: string; to: string }[] };
      const letter = items.find(({ to }) => to.includes(EMAIL));
      expect(letter).toBeDefined();
      const opened = await ask(administrator, 'GET', `/api/mail/${letter?.id ?? ''}`);
      found = ((await opened.json()) as { links: string[] }).links[0] ?? '';
    }).toPass({ timeout: 15_000 });
    return found;
  });

  const password = `slack water ${Date.now()}`;
  await page.goto(link);
  await page.getByLabel('New password').fill(password);
  await page.getByLabel('Once more').fill(password);
  await page.getByRole('button', { name: 'Keep this password' }).click();
  await page.getByRole('link', { name: 'Sign in with it' }).click();
  await page.getByRole('textbox', { name: 'E-mail' }).fill(EMAIL);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('button', { name: /Oskar Lindeqvam/ })).toBeVisible();

  await test.step('the link is good once', async () => {
    await page.goto(link);
    await page.getByLabel('New password').fill(`${password} again`);
    await page.getByLabel('Once more').fill(`${password} again`);
    await page.getByRole('button', { name: 'Keep this password' }).click();
    await expect(page.getByRole('alert')).toBeVisible();
  });
});
