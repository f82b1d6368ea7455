import { ask, readPart, searchParts } from '../../support/requests';
import { expect, test } from '../../support/test';

const MARKUP = '<img src=x onerror="document.title=1"> & <b>bold</b>';

test('a component engineer decides on a part that was submitted, step by step', async ({ signIn }) => {
  const engineer = await signIn('component-engineer');
  const librarian = await signIn('librarian');
  const { page } = engineer;
  // The last of them, so that the other stories find theirs untouched.
  const part = (await searchParts(engineer, { duty: { approvals: ['in-review'] } })).at(-1);
  if (part === undefined) throw new Error('The demonstration has nothing under review.');
  await page.goto(`/parts/${part.id}`);

  const decide = async (deed: string, fields: Record<string, string>): Promise<void> => {
    await page.getByRole('button', { name: deed, exact: true }).click();
    const dialog = page.getByRole('dialog', { name: deed });
    for (const [label, text] of Object.entries(fields)) await dialog.getByLabel(label).fill(text);
    await dialog.getByRole('button', { name: deed, exact: true }).click();
    await expect(dialog).toBeHidden();
  };
  const history = page.getByRole('region', { name: 'Approval history' });
  const newest = history.getByRole('listitem').first();

  await test.step('it goes back to draft, and the librarian submits it again', async () => {
    await expect(page.getByText('Submitted, waits for a review')).toBeVisible();
    await decide('Send back to draft', { Reason: 'Page 3 says 50 V' });
    await expect(newest).toContainText('Draft');
    await expect(page.getByText('waits for a review')).toHaveCount(0);
    const { version } = await readPart(librarian, part.id);
    const form = { to: 'in-review', reason: 'Mended', version };
    expect((await ask(librarian, 'POST', `/api/parts/${part.id}/approval`, form)).status()).toBe(200);
    await page.reload();
  });

  await test.step('it is approved, restricted in words that stay words, and freed again', async () => {
    await decide('Approve', { Reason: 'Read against its datasheet' });
    await expect(newest).toContainText('Approved');
    await decide('Restrict', {
      'What it may not be used for, or only for': MARKUP,
      'Scope: the products or sites it holds for': 'Buoy loggers',
      Reason: `Two things:\n${MARKUP}`,
    });
    await expect(page.getByText(`Restricted. ${MARKUP} Scope: Buoy loggers.`)).toBeVisible();
    await expect(newest).toContainText(MARKUP);
    await expect(page.locator('main img[src=x]')).toHaveCount(0);
    await decide('Change the restriction', {
      'What it may not be used for, or only for': 'Only indoors',
      'Scope: the products or sites it holds for': 'All',
      Reason: 'Salt mist',
    });
    await expect(page.getByText('Restricted. Only indoors Scope: All.')).toBeVisible();
    await decide('Lift the restriction', { Reason: 'Coated now' });
    await expect(page.getByText('Restricted. Only indoors')).toHaveCount(0);
  });

  await test.step('it is withdrawn, which only a submission undoes', async () => {
    await decide('Withdraw', { Reason: 'Cracks when bent' });
    await expect(newest).toContainText('Withdrawn');
    await expect(page.getByRole('button', { name: 'Approve', exact: true })).toHaveCount(0);
    await expect(page.getByRole('button', { name: 'Submit for review again' })).toBeVisible();
  });
  expect((await readPart(engineer, part.id)).approval).toBe('withdrawn');
});
