import type { Locator, Page } from '@playwright/test';
import { ask, readPart, searchParts } from '../../support/requests';
import { type Desk, expect, test } from '../../support/test';

const REASON = 'Drifts beyond its budget in salt mist, see report 118';

/** An approved part without an offer, far down the list, where no other story looks. */
async function somePart(desk: Desk): Promise<number> {
  const filters = { text: 'CEMN', offer: false };
  const parts = await searchParts(desk, { duty: { approvals: ['approved'] }, filters });
  const part = parts.at(-1);
  if (part === undefined) throw new Error('The demonstration has no such part.');
  return part.id;
}

async function openDialog(page: Page, deed: string): Promise<Locator> {
  await page.getByRole('button', { name: deed, exact: true }).click();
  const dialog = page.getByRole('dialog', { name: deed });
  await dialog.getByLabel('Reason').fill(REASON);
  return dialog;
}

const send = (dialog: Locator, deed: string): Promise<void> =>
  dialog.getByRole('button', { name: deed, exact: true }).click();

test('a dialog keeps what was typed while the server fails, is cut off or refuses', async ({ signIn }) => {
  const engineer = await signIn('component-engineer');
  const { page } = engineer;
  const id = await somePart(engineer);
  await page.goto(`/parts/${id}`);
  const dialog = await openDialog(page, 'Withdraw');
  const reason = dialog.getByLabel('Reason');
  const door = `**/api/parts/${id}/approval`;

  await test.step('a failure of the server', async () => {
    const problem = { type: 'urn:resistry:problem:unexpected', title: 'It went wrong', status: 500 };
    await page.route(door, (route) =>
      route.fulfill({ status: 500, contentType: 'application/problem+json', json: problem }),
    );
    await send(dialog, 'Withdraw');
    await expect(dialog.getByRole('alert')).toContainText('It went wrong');
    await expect(reason).toHaveValue(REASON);
    await page.unroute(door);
  });

  await test.step('no network, for the change and for everything that is read again', async () => {
    await page.context().setOffline(true);
    await send(dialog, 'Withdraw');
    await expect(dialog.getByRole('alert')).toContainText('The server did not answer');
    await page.context().setOffline(false);
    await expect(reason).toHaveValue(REASON);
  });

  await test.step('a rule that forbids it meanwhile', async () => {
    const problem = {
      type: 'urn:resistry:problem:forbidden',
      title: 'This is not yours to do',
      status: 403,
      detail: 'Only a component engineer withdraws parts.',
      rule: 'withdraw Part',
    };
    await page.route(door, (route) =>
      route.fulfill({ status: 403, contentType: 'application/problem+json', json: problem }),
    );
    await send(dialog, 'Withdraw');
    await expect(dialog.getByRole('alert')).toContainText('The rule: withdraw Part');
    await expect(reason).toHaveValue(REASON);
    await page.unroute(door);
  });

  await test.step('a sign-in that has ended: one signs in again above the dialog', async () => {
    await page.route('**/api/**', (route) =>
      route.request().url().includes('/auth/sign-in')
        ? route.continue()
        : route.fulfill({
            status: 401,
            contentType: 'application/problem+json',
            json: { type: 'urn:resistry:problem:unauthenticated', title: 'Sign in', status: 401 },
          }),
    );
    await send(dialog, 'Withdraw');
    const again = page.getByRole('dialog', { name: /sign in again/i });
    await expect(again).toBeVisible();
    await page.unroute('**/api/**');
    await again.getByLabel('Password').fill('brackwater-demo');
    await again.getByRole('button', { name: 'Sign in' }).click();
    await expect(again).toBeHidden();
  });

  // The change waited for the sign-in, and is made with what was typed.
  await expect(dialog).toBeHidden();
  await expect(page.getByRole('region', { name: 'Approval history' })).toContainText(REASON);
  expect((await readPart(engineer, id)).approval).toBe('withdrawn');
});

test('of two who decide at once the second is told what the part is now, and may go on', async ({
  signIn,
}) => {
  const first = await signIn('component-engineer');
  const second = await signIn('component-engineer');
  const id = await somePart(first);
  for (const { page } of [first, second]) await page.goto(`/parts/${id}`);
  const slow = await openDialog(second.page, 'Withdraw');
  const quick = await openDialog(first.page, 'Restrict');
  await quick.getByLabel('What it may not be used for, or only for').fill('Only indoors');
  await quick.getByLabel('Scope: the products or sites it holds for').fill('All');
  await send(quick, 'Restrict');
  await expect(quick).toBeHidden();

  await send(slow, 'Withdraw');
  await expect(slow.getByRole('alert')).toContainText('has been changed since you opened it');
  await expect(slow.getByText('it is restricted now. What you wrote is still here.')).toBeVisible();
  await expect(slow.getByLabel('Reason')).toHaveValue(REASON);
  await send(slow, 'Withdraw');
  await expect(slow).toBeHidden();
  expect((await readPart(second, id)).approval).toBe('withdrawn');
});

test('what a promotion demands and the part lacks stands in its dialog, and the server holds to it', async ({
  signIn,
}) => {
  const engineer = await signIn('component-engineer');
  const { page } = engineer;
  const id = await somePart(engineer);
  await page.goto(`/parts/${id}`);
  const dialog = await openDialog(page, 'Promote to preferred');
  await expect(dialog.getByRole('listitem').filter({ hasText: 'not met' }).first()).toBeVisible();
  await send(dialog, 'Promote to preferred');
  await expect(dialog.getByRole('alert').first()).toBeVisible();
  await expect(dialog.getByLabel('Reason')).toHaveValue(REASON);
  const { version } = await readPart(engineer, id);
  const form = { to: 'preferred', reason: REASON, version };
  const refusal = await ask(engineer, 'POST', `/api/parts/${id}/approval`, form);
  expect(refusal.status()).toBe(422);
  expect((await readPart(engineer, id)).approval).toBe('approved');
});
