import { ask, readPart, searchParts } from '../../support/requests';
import { expect, test } from '../../support/test';

test('what the pages do not offer a designer, the server refuses as well, and nothing changes', async ({
  signIn,
}) => {
  const designer = await signIn('designer');
  const [part] = await searchParts(designer, { duty: { approvals: ['approved'] } });
  const { id, version } = await readPart(designer, part?.id ?? NaN);

  await designer.page.goto(`/parts/${id}`);
  await expect(designer.page.getByRole('heading', { level: 1 })).toBeVisible();
  for (const name of ['Promote to preferred', 'Withdraw', 'Set to discontinued']) {
    await expect(designer.page.getByRole('button', { name })).toHaveCount(0);
  }

  const attempts = [
    { door: 'approval', form: { to: 'preferred', reason: 'I need it', version } },
    { door: 'approval', form: { to: 'withdrawn', reason: 'I do not need it', version } },
    { door: 'supply', form: { to: 'discontinued', reason: 'I heard so', version } },
  ];
  for (const { door, form } of attempts) {
    const refusal = await ask(designer, 'POST', `/api/parts/${id}/${door}`, form);
    expect(refusal.status(), form.to).toBe(403);
    expect(await refusal.json()).toMatchObject({
      type: 'urn:resistry:problem:forbidden',
      rule: expect.any(String),
    });
  }
  expect(await readPart(designer, id)).toMatchObject({ approval: 'approved', supply: 'active', version });
});
