import { ask } from '../../support/requests';
import { expect, test } from '../../support/test';

test('an administrator invites somebody, changes the roles, keeps the person out and lets back in', async ({
  openContext,
  signIn,
}) => {
  const administrator = await signIn('administrator');
  const { page } = administrator;
  const email = `guest-${Date.now()}@brackwater.example.com`;
  const password = `slack water ${Date.now()}`;
  await page.goto('/people');
  await page.getByLabel('E-mail').fill(email);
  await page.getByRole('checkbox', { name: 'purchasing' }).last().check();
  await page.getByRole('button', { name: 'Invite' }).click();
  await expect(page.getByText(`An invitation is on its way to ${email}.`)).toBeVisible();

  let link = '';
  await expect(async () => {
    const box = await ask(administrator, 'GET', '/api/mail');
    const { items } = (await box.json()) as { items: { id: string; to: string }[] };
    const letter = items.find(({ to }) => to.includes(email));
    const opened = await ask(administrator, 'GET', `/api/mail/${letter?.id ?? ''}`);
    link = ((await opened.json()) as { links: string[] }).links[0] ?? '';
    expect(link).not.toBe('');
  }).toPass({ timeout: 15_000 });

  const guest = await (await openContext()).newPage();
  await guest.goto(link);
  await guest.getByLabel('Name').fill('<i>Guest</i> & Co');
  await guest.getByLabel('Password').fill(password);
  await guest.getByLabel('Once more').fill(password);
  await guest.getByRole('button', { name: 'Open the account' }).click();
  await guest.getByRole('link', { name: 'Sign in' }).click();
  await guest.getByLabel('E-mail').fill(email);
  await guest.getByLabel('Password').fill(password);
  await guest.getByRole('button', { name: 'Sign in' }).click();
  await expect(guest.getByRole('button', { name: /<i>Guest<\/i> & Co/ })).toBeVisible();

  await page.reload();
  await page.getByRole('button', { name: 'Change the roles of <i>Guest</i> & Co' }).click();
  const roles = page.getByRole('dialog', { name: 'Roles of <i>Guest</i> & Co' });
  await roles.getByRole('checkbox', { name: 'librarian' }).check();
  await roles.getByLabel('Reason').fill('Enters families now');
  await roles.getByRole('button', { name: 'Give these roles' }).click();
  await expect(roles).toBeHidden();
  await expect(page.getByRole('row', { name: /Guest/ })).toContainText('librarian, designer, purchasing');

  await page.getByRole('button', { name: 'Keep <i>Guest</i> & Co out' }).click();
  const out = page.getByRole('dialog', { name: /^Keep .* out$/ });
  await out.getByLabel('Reason').fill('The visit is over');
  await out.getByRole('button', { name: 'Keep out' }).click();
  await expect(out).toBeHidden();
  await guest.goto('/families');
  await expect(guest.getByRole('button', { name: 'Sign in' })).toBeVisible();
  await guest.getByLabel('E-mail').fill(email);
  await guest.getByLabel('Password').fill(password);
  await guest.getByRole('button', { name: 'Sign in' }).click();
  await expect(guest.getByRole('alert')).toBeVisible();

  await page.getByRole('button', { name: 'Let <i>Guest</i> & Co back in' }).click();
  const back = page.getByRole('dialog', { name: /back in$/ });
  await back.getByLabel('Reason').fill('Came again');
  await back.getByRole('button', { name: 'Let back in' }).click();
  await expect(back).toBeHidden();
  await guest.getByRole('button', { name: 'Sign in' }).click();
  await expect(guest.getByRole('heading', { name: 'Families' })).toBeVisible();

  await page.goto('/audit?subject=User');
  const rows = page.getByRole('table', { name: 'Audit trail' }).getByRole('row');
  await expect(rows.nth(1)).toContainText('reactivate user');
  await expect(rows.nth(2)).toContainText('The visit is over');
  await expect(rows.nth(3)).toContainText('Enters families now');
});
