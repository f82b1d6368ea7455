import { searchParts } from '../../support/requests';
import { expect, test } from '../../support/test';

const day = (days: number): string => new Date(Date.now() + days * 86_400_000).toISOString().slice(0, 10);

test('purchasing enters, changes and ends an offer, and the trail says who, what and why', async ({
  signIn,
}) => {
  const purchasing = await signIn('purchasing');
  const { page } = purchasing;
  const part = (
    await searchParts(purchasing, {
      duty: { approvals: ['approved'] },
      filters: { text: 'SALT', offer: false },
    })
  ).at(-1);
  if (part === undefined) throw new Error('The demonstration has no such part.');
  // A price of its own, so that a second run on the same part finds its row.
  const price = `0.00${String(Date.now() % 10_000).padStart(4, '1')}`;
  await page.goto(`/parts/${part.id}`);
  await page.getByRole('button', { name: 'Enter an offer' }).click();
  const entering = page.getByRole('dialog', { name: 'Enter the offer' });
  await entering.getByLabel('Supplier').selectOption({ index: 1 });
  await entering.getByLabel('Packaging').selectOption({ index: 1 });
  await entering.getByLabel('Smallest order, pieces').fill('100');
  await entering.getByLabel('In multiples of').fill('30');
  await entering.getByLabel('Valid from').fill(day(-1));
  await entering.getByLabel('Valid until').fill(day(90));
  await entering.getByLabel('Lead time, days').fill('21');
  await entering.getByLabel(/^Prices/).fill(`100 0,0992\n1000 ${price}`);
  await expect(entering.getByText(/^from 100: € 0.0992; from 1,000: € 0.00/)).toBeVisible();
  await entering.getByLabel('Reason').fill('Quotation <b>4711</b>');
  await entering.getByRole('button', { name: 'Enter the offer' }).click();
  await expect(entering.getByText('The minimum order of 100 is no multiple of 30.').first()).toBeVisible();
  await entering.getByLabel('In multiples of').fill('50');
  await entering.getByRole('button', { name: 'Enter the offer' }).click();
  await expect(entering).toBeHidden();
  const offers = page.getByRole('table', { name: 'Offers, € a piece' });
  const offer = offers.getByRole('row').filter({ hasText: price.replace(/0+$/, '') });
  await expect(offer).toContainText('21 days');

  await offer.getByRole('button', { name: 'Change' }).click();
  const changing = page.getByRole('dialog', { name: 'Change the offer' });
  await changing.getByLabel('Lead time, days').fill('35');
  await changing.getByLabel('Reason').fill('Letter of the supplier');
  await changing.getByRole('button', { name: 'Change the offer' }).click();
  await expect(changing).toBeHidden();
  await expect(offer).toContainText('35 days');

  await offer.getByRole('button', { name: 'End' }).click();
  const ending = page.getByRole('dialog', { name: 'End the offer' });
  await ending.getByLabel('Reason').fill('Supplier closed');
  await ending.getByRole('button', { name: 'End the offer' }).click();
  await expect(ending).toBeHidden();
  await expect(offer).toContainText('ended');

  const { page: office } = await signIn('administrator');
  await office.goto('/audit?subject=Offer');
  const rows = office.getByRole('table', { name: 'Audit trail' }).getByRole('row');
  await expect(rows.nth(1)).toContainText(`end offer`);
  await expect(rows.nth(1)).toContainText(part.manufacturerPartNumber);
  await expect(rows.nth(1)).toContainText('Supplier closed');
  await expect(rows.nth(2)).toContainText('lead time days: 21 → 35');
  await expect(rows.nth(3)).toContainText('Quotation <b>4711</b>');
});

test('a last-time buy has its last order date, which can be changed but has not passed', async ({
  signIn,
}) => {
  const purchasing = await signIn('purchasing');
  const { page } = purchasing;
  const part = (
    await searchParts(purchasing, { duty: { approvals: ['approved'] }, filters: { text: 'OXBO' } })
  ).at(-1);
  if (part === undefined) throw new Error('The demonstration has no such part.');
  await page.goto(`/parts/${part.id}`);
  const announce = async (deed: string, date: string): Promise<void> => {
    await page.getByRole('button', { name: deed }).click();
    const dialog = page.getByRole('dialog', { name: deed });
    await dialog.getByLabel('Reason').fill('Vendor notice 12');
    await dialog.getByLabel('Last order date').fill('');
    await dialog.getByRole('button', { name: deed }).click();
    await expect(dialog.getByText('Give the last order date.')).toBeVisible();
    await dialog.getByLabel('Last order date').fill(day(-3));
    await dialog.getByRole('button', { name: deed }).click();
    await expect(dialog.getByText(/has passed/).first()).toBeVisible();
    await expect(dialog.getByLabel('Reason')).toHaveValue('Vendor notice 12');
    await dialog.getByLabel('Last order date').fill(date);
    await dialog.getByRole('button', { name: deed }).click();
    await expect(dialog).toBeHidden();
  };
  await announce('Announce a last-time buy', day(60));
  await expect(page.getByText('Left active supply, waits for a review')).toBeVisible();
  await announce('Change the last order date', day(120));
  await expect(page.getByRole('region', { name: 'Supply history' }).getByRole('listitem')).toHaveCount(2);
});
