import { Readers } from '../src/database/readers';
import { PriceRefresh } from '../src/parts/price-refresh';
import { StandingChanges } from '../src/parts/standing-changes';
import { startApplication, type StartedApplication } from './support/application';
import { CatalogueBuilder } from './support/catalogue-builder';
import type { SignedInPerson } from './support/people-builder';
import { temporaryFolder } from './support/temporary-folder';

const DAY_SECONDS = 24 * 3600;

describe('stored prices', () => {
  const folder = temporaryFolder();
  let application: StartedApplication;
  let designer: SignedInPerson;
  beforeEach(async () => {
    application = await startApplication({ dataDirectory: folder.path('data') });
    designer = await application.people.signIn('designer');
  });
  afterEach(() => application.stop());

  it('follow the offers that come into force and run out, and whoever keeps a copy is told', async () => {
    const day = (days: number): string => application.clock.timestampIn(days * DAY_SECONDS).slice(0, 10);
    const catalogue = new CatalogueBuilder(application.nest, designer.person.id, day(0));
    const family = await catalogue.family({
      code: 'SKUA',
      manufacturerId: await catalogue.manufacturer('NORVIK'),
    });
    const [one, two, three] = [
      await catalogue.part({ family, number: 'SKUA-1' }),
      await catalogue.part({ family, number: 'SKUA-2' }),
      await catalogue.part({ family, number: 'SKUA-3' }),
    ];
    await catalogue.offer(one, { from: day(-9), until: day(0), price: 0.01 });
    await catalogue.offer(one, { from: day(2), until: day(9), price: 0.03 });
    await catalogue.offer(two, { from: day(1), until: day(9), price: 0.02 });
    await catalogue.offer(three, { from: day(-9), until: day(9), price: 0.04 });
    await catalogue.rebuild();
    const prices = async (): Promise<(number | null)[]> => {
      const rows = await application.nest
        .get(Readers)
        .select<{ micro: number | null }>('SELECT derived_unit_price_micro AS micro FROM parts ORDER BY id');
      return rows.map(({ micro }) => micro);
    };
    const told: number[][] = [];
    application.nest.get(StandingChanges, { strict: false }).subscribe((ids) => {
      told.push([...ids]);
      return Promise.resolve();
    });
    const refresh = application.nest.get(PriceRefresh, { strict: false });

    expect(await refresh.refresh()).toEqual([]);
    expect(await prices()).toEqual([10_000, null, 40_000]);
    application.clock.forward(DAY_SECONDS);
    expect((await refresh.refresh()).sort()).toEqual([one, two]);
    expect(await prices()).toEqual([null, 20_000, 40_000]);
    application.clock.forward(DAY_SECONDS);
    await refresh.nightly();
    expect(await prices()).toEqual([30_000, 20_000, 40_000]);
    expect(told.map((ids) => ids.sort())).toEqual([[one, two], [one]]);
  });

  it('are brought to the day at the start', async () => {
    const catalogue = new CatalogueBuilder(application.nest, designer.person.id, '2026-03-01');
    const family = await catalogue.family({
      code: 'SKUA',
      manufacturerId: await catalogue.manufacturer('NORVIK'),
    });
    const part = await catalogue.part({ family, number: 'SKUA-1' });
    await catalogue.offer(part, { from: '2026-02-01', until: '2026-03-31' });
    await catalogue.rebuild();
    const price = async (): Promise<unknown> =>
      ((await designer.get(`/api/parts/${part}`).expect(200)).body as { unitPrice?: number }).unitPrice;
    expect(await price()).toBe(0.01);
    await application.close();
    application = await startApplication({ dataDirectory: folder.path('data') });
    designer = await application.people.signInAs(designer.person);
    expect(await price()).toBeUndefined();
  });
});
