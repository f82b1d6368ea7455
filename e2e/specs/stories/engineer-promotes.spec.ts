import { approvalTransition, ask, firstThat, readPart, searchParts } from '../../support/requests';
import { type Desk, expect, test } from '../../support/test';

const APPROVED = { approvals: ['approved'], supply: ['active'], secondSource: true };

/** A part that everything is in place for to be preferred. */
const promotable = async (desk: Desk) =>
  firstThat(await searchParts(desk, { duty: APPROVED, filters: { offer: true } }), async ({ id }) => {
    const transition = await approvalTransition(desk, id, 'preferred');
    return transition?.allowed === true && transition.demands.every(({ met }) => met);
  });

/** An approved part that the one who asks entered. */
const ownPart = async (desk: Desk) =>
  firstThat(
    await searchParts(desk, { duty: { approvals: ['approved'] }, filters: { text: 'BOLT' } }),
    async ({ id }) => {
      const transition = await approvalTransition(desk, id, 'preferred');
      return transition?.forbiddenBy !== undefined;
    },
  );

test('a component engineer promotes a part, with a reason that stands in its history', async ({ signIn }) => {
  const engineer = await signIn('component-engineer');
  const { page } = engineer;
  const part = await promotable(engineer);
  await page.goto(`/parts/${part.id}`);
  await page.getByRole('button', { name: 'Promote to preferred' }).click();
  const dialog = page.getByRole('dialog', { name: 'Promote to preferred' });
  await dialog.getByRole('textbox', { name: 'Reason' }).fill('Common to all loggers since the spring');
  await dialog.getByRole('button', { name: 'Promote to preferred' }).click();
  await expect(dialog).toBeHidden();
  await expect(page.getByRole('main')).toContainText('Common to all loggers since the spring');
  await expect(page.getByRole('button', { name: 'Back to approved' })).toBeVisible();
  expect((await readPart(engineer, part.id)).approval).toBe('preferred');
});

test('nobody promotes what he or she entered: the page says so and the server refuses it', async ({
  signIn,
}) => {
  const engineer = await signIn('component-engineer');
  const { page } = engineer;
  const part = await ownPart(engineer);
  await page.goto(`/parts/${part.id}`);
  const changes = page.getByRole('region', { name: 'What may become of it' });
  await changes.locator('summary').click();
  await expect(changes.getByText('Only a component engineer promotes')).toBeVisible();
  await expect(changes.getByRole('button', { name: 'Promote to preferred' })).toHaveCount(0);

  const { version } = await readPart(engineer, part.id);
  const form = { to: 'preferred', reason: 'By another way', exception: 'None needed', version };
  const refusal = await ask(engineer, 'POST', `/api/parts/${part.id}/approval`, form);
  expect(refusal.status()).toBe(403);
  expect(((await refusal.json()) as { rule: string }).rule).toContain('promote');
  expect(await readPart(engineer, part.id)).toMatchObject({ approval: 'approved', version });
});
