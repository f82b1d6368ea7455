import { found } from '../../support/find';
import { readPart, searchParts } from '../../support/requests';
import { expect, test } from '../../support/test';

test('purchasing ends the life of a part, and Find shows it at once', async ({ signIn }) => {
  const purchasing = await signIn('purchasing');
  const designer = await signIn('designer');
  const [part] = await searchParts(purchasing, { duty: { approvals: ['preferred'], supply: ['active'] } });
  if (part === undefined) throw new Error('The demonstration has no preferred part.');
  const address = `/find?text=${encodeURIComponent(part.manufacturerPartNumber)}`;
  const heading = designer.page.getByRole('heading', { level: 1 });
  await designer.page.goto(address);
  await found(designer.page);
  await expect(heading).toHaveText('1 part meets it');

  const { page } = purchasing;
  await page.goto(`/parts/${part.id}`);
  await page.getByRole('button', { name: 'Set to discontinued' }).click();
  const dialog = page.getByRole('dialog', { name: 'Set to discontinued' });
  await dialog.getByRole('textbox', { name: 'Reason' }).fill('The factory closes its line');
  await dialog.getByRole('button', { name: 'Set to discontinued' }).click();
  await expect(dialog).toBeHidden();
  await expect(page.getByRole('main')).toContainText('The factory closes its line');
  expect((await readPart(purchasing, part.id)).supply).toBe('discontinued');

  await designer.page.goto(address);
  await found(designer.page);
  await expect(heading).toHaveText('0 parts meet it');
  await designer.page.goto(`${address}&supply=active,discontinued`);
  await found(designer.page);
  await expect(heading).toHaveText('1 part meets it');
});
