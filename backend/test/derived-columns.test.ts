import { type DerivedScope, rebuildDerivedColumns } from '../src/parts/derived-columns';
import { startApplication, type StartedApplication } from './support/application';
import { SmallCatalogue } from './support/small-catalogue';

const TODAY = '2026-12-01';
const AT = '2026-01-05T09:00:00.000Z';

interface Derived {
  range: { tolerance: number; tcr: number } | null;
  price: number | null;
  secondSource: number;
}

describe('derived columns', () => {
  let application: StartedApplication;
  let catalogue: SmallCatalogue;
  let personId: number;
  beforeEach(async () => {
    application = await startApplication();
    personId = (await application.people.add('librarian')).id;
    catalogue = await SmallCatalogue.in(application.nest, personId);
  });
  afterEach(() => application.stop());

  const rebuild = (scope: DerivedScope = 'all', today = TODAY): Promise<number> =>
    catalogue.within((transaction) => rebuildDerivedColumns(catalogue.writer, transaction, scope, today));

  const derived = async (number: string): Promise<Derived> => {
    const [row] = await catalogue.select<{
      tolerance: number | null;
      tcr: number;
      price: number | null;
      second: number;
    }>(
      `SELECT r.tolerance_fraction AS tolerance, r.tcr_per_kelvin AS tcr, p.derived_unit_price_micro AS price,
         p.derived_second_source AS second
       FROM parts AS p LEFT JOIN ranges AS r ON r.id = p.derived_range_id WHERE p.manufacturer_part_number = $number`,
      { number },
    );
    if (!row) throw new Error(`There is no ${number}.`);
    const range = row.tolerance === null ? null : { tolerance: row.tolerance, tcr: row.tcr };
    return { range, price: row.price, secondSource: row.second };
  };

  const everything = (): Promise<object[]> =>
    catalogue.select(
      `SELECT p.id, derived_range_id, derived_unit_price_micro, derived_second_source, t.manufacturer_part_number,
         t.company_part_number, t.family, t.manufacturer
       FROM parts AS p LEFT JOIN part_text AS t ON t.rowid = p.id ORDER BY p.id`,
    );

  const offer = async (
    number: string,
    breaks: Record<number, number>,
    changes: { minimum?: number; from?: string; until?: string } = {},
  ): Promise<void> => {
    await catalogue.run(`INSERT INTO suppliers (code, name) VALUES ('S', 'Supplier') ON CONFLICT DO NOTHING`);
    await catalogue.within(async (transaction) => {
      const id = await catalogue.writer.insert(
        transaction,
        `INSERT INTO offers (part_id, supplier_id, packaging_code, minimum_order, order_multiple, lead_time_days,
           valid_from, valid_until, entered_by, entered_at)
         SELECT $part, id, 'T', $minimum, 1, 7, $from, $until, $personId, $at FROM suppliers`,
        {
          part: catalogue.part(number),
          minimum: changes.minimum ?? 1,
          from: changes.from ?? '2026-01-01',
          until: changes.until ?? '2027-01-01',
          personId,
          at: AT,
        },
      );
      for (const [quantity, price] of Object.entries(breaks)) {
        await catalogue.writer.run(
          transaction,
          'INSERT INTO offer_price_breaks (offer_id, quantity, unit_price_micro) VALUES ($id, $quantity, $price)',
          { id, quantity: Number(quantity), price },
        );
      }
    });
  };

  const sources = async (companyNumber: string, ...numbers: string[]): Promise<void> => {
    await catalogue.run(
      `INSERT INTO company_part_numbers (number, description, entered_by, entered_at)
       VALUES ($companyNumber, 'resistor', $personId, $at)`,
      { companyNumber, personId, at: AT },
    );
    for (const [place, number] of numbers.entries()) {
      await catalogue.run(
        `INSERT INTO approved_sources (company_part_number_id, part_id, position, added_by, added_at)
         SELECT id, $part, $place, $personId, $at FROM company_part_numbers WHERE number = $companyNumber`,
        { part: catalogue.part(number), place, personId, at: AT, companyNumber },
      );
    }
  };

  const set = (number: string, column: 'approval' | 'supply', value: string): Promise<void> =>
    catalogue.run(`UPDATE parts SET ${column} = $value WHERE id = $id`, {
      value,
      id: catalogue.part(number),
    });

  describe('range: the row of the current revision that holds the part', () => {
    it('is told by tolerance, TCR and value, both ends included; a link has none', async () => {
      await rebuild();
      expect((await derived('TSTA0603F1001000')).range).toEqual({ tolerance: 0.01, tcr: 100e-6 });
      expect((await derived('TSTA0603F2001000')).range).toEqual({ tolerance: 0.01, tcr: 200e-6 });
      expect((await derived('TSTA0603F1003300')).range).toEqual({ tolerance: 0.01, tcr: 100e-6 });
      expect((await derived('TSTA0603J2002200')).range).toEqual({ tolerance: 0.05, tcr: 200e-6 });
      expect((await derived('TSTA060300000000')).range).toBeNull();
    });

    it('is none for a part that the current revision no longer holds', async () => {
      await rebuild();
      await catalogue.run(
        `INSERT INTO family_revisions (family_id, number, description, ordering_code_template, entered_by, entered_at)
         SELECT family_id, 2, 'Second', ordering_code_template, entered_by, entered_at FROM family_revisions
         WHERE family_id = $family`,
        { family: catalogue.families[0]!.familyId },
      );
      await catalogue.run(
        `INSERT INTO ranges (revision_id, size_id, tolerance_fraction, tcr_per_kelvin, resistance_min_ohm,
           resistance_max_ohm, series)
         SELECT r.id, s.id, 0.01, 0.0001, 100, 220, '["E6"]' FROM family_revisions AS r
           JOIN sizes AS s ON s.family_id = r.family_id WHERE r.number = 2`,
      );
      await catalogue.run(
        `UPDATE families SET current_revision_id = (SELECT id FROM family_revisions WHERE number = 2) WHERE id = $family`,
        { family: catalogue.families[0]!.familyId },
      );
      await rebuild();
      expect((await derived('TSTA0603F1002200')).range).toEqual({ tolerance: 0.01, tcr: 100e-6 });
      expect((await derived('TSTA0603F1003300')).range).toBeNull();
      expect((await derived('TSTB0603F1003300')).range).toEqual({ tolerance: 0.01, tcr: 100e-6 });
    });
  });

  describe('price: the lowest at 1000 pieces among the offers in force', () => {
    const part = 'TSTA0603F1001000';
    const price = async (today = TODAY): Promise<number | null> => {
      await rebuild('all', today);
      return (await derived(part)).price;
    };

    it('is none without an offer', async () => {
      expect(await price()).toBeNull();
    });

    it('takes the largest break up to 1000 of each offer, and the lowest of the offers', async () => {
      await offer(part, { 1: 9000, 100: 5000, 1000: 3000, 5000: 1000 });
      expect(await price()).toBe(3000);
      await offer(part, { 1: 9000, 500: 2500 });
      expect(await price()).toBe(2500);
      await offer(part, { 1001: 10 });
      expect(await price()).toBe(2500);
    });

    it('leaves out an offer whose minimum order is above 1000', async () => {
      await offer(part, { 1: 100 }, { minimum: 1001 });
      expect(await price()).toBeNull();
      await offer(part, { 1: 200 }, { minimum: 1000 });
      expect(await price()).toBe(200);
    });

    it('counts offers on their first and last day and not outside', async () => {
      await offer(part, { 1: 100 }, { from: '2026-12-01', until: '2026-12-31' });
      expect(await price('2026-11-30')).toBeNull();
      expect(await price('2026-12-01')).toBe(100);
      expect(await price('2026-12-31')).toBe(100);
      expect(await price('2027-01-01')).toBeNull();
    });
  });

  describe('second source: another manufacturer’s approved or preferred and active part under the same number', () => {
    // TSTA and TSTC are North's, TSTB is South's.
    const [own, other, sibling] = ['TSTA0603F1001000', 'TSTB0603F1001000', 'TSTC0603F1001000'];
    const secondSource = async (number = own): Promise<number> => {
      await rebuild();
      return (await derived(number)).secondSource;
    };

    it('counts the other part’s approval and supply, not the part’s own', async () => {
      await sources('BW-1', own, other);
      expect(await secondSource()).toBe(0);
      for (const [approval, expected] of [
        ['in-review', 0],
        ['approved', 1],
        ['preferred', 1],
        ['withdrawn', 0],
      ] as const) {
        await set(other, 'approval', approval);
        expect(await secondSource()).toBe(expected);
      }
      await set(other, 'approval', 'approved');
      expect(await secondSource(other)).toBe(0);
      for (const supply of ['not-recommended', 'last-time-buy', 'discontinued']) {
        await set(other, 'supply', supply);
        expect(await secondSource()).toBe(0);
      }
    });

    it('does not count the same manufacturer, nor another number', async () => {
      await sources('BW-1', own, sibling);
      await sources('BW-2', other);
      await set(sibling, 'approval', 'approved');
      await set(other, 'approval', 'approved');
      expect(await secondSource()).toBe(0);
    });
  });

  it('finds parts by pieces of their numbers, family and manufacturer', async () => {
    await sources('BW-R-00417', 'TSTA0603F1001000');
    await rebuild();
    const find = async (words: string): Promise<number[]> =>
      (
        await catalogue.select<{ id: number }>(
          'SELECT rowid AS id FROM part_text WHERE part_text MATCH $words',
          { words },
        )
      ).map((row) => row.id);
    expect(await find('"03F1001000"')).toHaveLength(3);
    expect(await find('"00417"')).toEqual([catalogue.part('TSTA0603F1001000')]);
    const own = catalogue.families[1]!.parts.map((part) => part.id);
    expect(await find('"south"')).toEqual(own);
    expect(await find('"TSTB Chip"')).toEqual(own);
  });

  it('rebuilds some parts, with the other sources of their numbers, as it would rebuild all', async () => {
    await sources('BW-1', 'TSTA0603F1001000', 'TSTB0603F1001000');
    await rebuild();
    await set('TSTB0603F1001000', 'approval', 'approved');
    await offer('TSTB0603F1001000', { 1: 4200 });
    const before = await everything();
    expect(await rebuild([catalogue.part('TSTB0603F1001000')])).toBe(2);
    const some = await everything();
    expect(some).not.toEqual(before);
    expect((await derived('TSTA0603F1001000')).secondSource).toBe(1);
    await rebuild();
    expect(await everything()).toEqual(some);
    expect(await rebuild([])).toBe(0);
  });
});
