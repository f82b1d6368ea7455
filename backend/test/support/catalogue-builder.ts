import type { NestExpressApplication } from '@nestjs/platform-express';
import type { Approval, SupplyStatus, Technology } from '@resistry/engineering/ratings/technology';
import type { Transaction } from 'sequelize';
import type { BindValue } from '../../src/database/bind-values';
import { Writer } from '../../src/database/writer';
import { rebuildDerivedColumns } from '../../src/parts/derived-columns';

type Columns = Record<string, BindValue>;

export interface FamilyChoice {
  code: string;
  name?: string;
  manufacturerId: number;
  technology?: Technology;
  features?: string[];
  /** Whether the revision names a datasheet; with one, every rating is cited from its page 2. */
  datasheet?: boolean;
}

export interface BuiltFamily {
  id: number;
  sizeId: number;
  revisionId: number;
}

export interface PartChoice {
  family: BuiltFamily;
  number: string;
  resistance?: number;
  tolerance?: number | null;
  tcr?: number | null;
  approval?: Approval;
  supply?: SupplyStatus;
  enteredBy?: number;
}

const ENTERED_AT = '2026-01-05T09:00:00.000Z';

/**
 * Fills a test's catalogue with what it names; the rest is a 0603 chip: 0.1 W to 70 °C, nothing at 155 °C, 75 V, −55 °C to
 * 155 °C, ±1 % at 100 ppm/K from 1 Ω to 10 MΩ.
 */
export class CatalogueBuilder {
  private readonly writer: Writer;

  /** @param enteredBy id of the account that enters everything, unless a part names another */
  constructor(
    application: NestExpressApplication,
    private readonly enteredBy: number,
    private readonly today = new Date().toISOString().slice(0, 10),
  ) {
    this.writer = application.get(Writer);
  }

  async manufacturer(code: string, name = `${code} Works`): Promise<number> {
    return this.insert('manufacturers', {
      code,
      name,
      country: 'Vessmark',
      note: null,
      ...this.entered(),
    });
  }

  /** A family of one size with one published revision. */
  async family(choice: FamilyChoice, size: { columns?: Columns; mode?: Columns } = {}): Promise<BuiltFamily> {
    return this.writer.transaction(async (transaction) => {
      const add = (table: string, columns: Columns): Promise<number> => this.add(transaction, table, columns);
      const id = await add('families', {
        manufacturer_id: choice.manufacturerId,
        code: choice.code,
        name: choice.name ?? 'Thick film chip',
        technology: choice.technology ?? 'thick-film',
        ...this.entered(),
      });
      const sizeId = await add('sizes', { family_id: id, code: '0603', metric_code: '1608M', position: 1 });
      const datasheetId =
        choice.datasheet === false
          ? null
          : await add('datasheets', {
              family_id: id,
              title: `${choice.code} chips`,
              document_number: `${choice.code}-1`,
              revision: 'A',
              issued_on: '2025-10-01',
              page_count: 9,
            });
      const revisionId = await add('family_revisions', {
        family_id: id,
        number: 1,
        description: 'First entry',
        datasheet_id: datasheetId,
        reference_temperature_celsius: 20,
        features: JSON.stringify(choice.features ?? []),
        ordering_code_template: '{family}{size}{tolerance}{resistance:four}[-{packaging}]',
        ...this.entered(),
      });
      const ratingsId = await add('size_ratings', {
        revision_id: revisionId,
        size_id: sizeId,
        mounting: 'surface',
        body_style: 'chip',
        body_length_metre: 0.0016,
        body_width_metre: 0.0008,
        body_height_metre: 0.00045,
        land_pattern: 'rect-chip 1608 nominal',
        limiting_element_voltage_volt: 75,
        category_min_celsius: -55,
        category_max_celsius: 155,
        ...size.columns,
      });
      await add('operating_modes', {
        size_ratings_id: ratingsId,
        position: 1,
        name: 'standard',
        rated_dissipation_watt: 0.1,
        derating_axis: 'ambient',
        derating_points: '[[70,1],[155,0]]',
        ...size.mode,
      });
      await add('ranges', {
        revision_id: revisionId,
        size_id: sizeId,
        tolerance_fraction: 0.01,
        tcr_per_kelvin: 1e-4,
        resistance_min_ohm: 1,
        resistance_max_ohm: 1e7,
        series: '["E24","E96"]',
      });
      await add('packagings', {
        revision_id: revisionId,
        size_id: sizeId,
        code: 'T5',
        description: 'paper tape',
        quantity: 5000,
      });
      if (datasheetId !== null) {
        await add('citations', {
          revision_id: revisionId,
          size_id: null,
          field: 'ratedDissipation',
          datasheet_id: datasheetId,
          page: 2,
        });
      }
      await this.writer.run(
        transaction,
        `UPDATE family_revisions SET state = 'published', published_by = $by, published_at = $at WHERE id = $id`,
        { id: revisionId, by: this.enteredBy, at: ENTERED_AT },
      );
      await this.writer.run(
        transaction,
        'UPDATE families SET current_revision_id = $revisionId WHERE id = $id',
        {
          id,
          revisionId,
        },
      );
      return { id, sizeId, revisionId };
    });
  }

  async part(choice: PartChoice): Promise<number> {
    const { family, approval = 'draft', resistance = 4700 } = choice;
    return this.insert('parts', {
      family_id: family.id,
      size_id: family.sizeId,
      manufacturer_part_number: choice.number,
      resistance_ohm: resistance,
      tolerance_fraction:
        choice.tolerance === undefined ? (resistance === 0 ? null : 0.01) : choice.tolerance,
      tcr_per_kelvin: choice.tcr === undefined ? (resistance === 0 ? null : 1e-4) : choice.tcr,
      approval,
      restriction_words: approval === 'restricted' ? 'Not above half of the rated dissipation.' : null,
      restriction_scope: approval === 'restricted' ? 'Buoy loggers' : null,
      supply: choice.supply ?? 'active',
      ...this.entered(choice.enteredBy),
    });
  }

  async companyPartNumber(number: string, partIds: readonly number[]): Promise<number> {
    const id = await this.insert('company_part_numbers', {
      number,
      description: `Resistor ${number}`,
      ...this.entered(),
    });
    for (const [place, partId] of partIds.entries()) {
      await this.run(
        `INSERT INTO approved_sources (company_part_number_id, part_id, position, added_by, added_at)
          VALUES ($id, $partId, $position, $by, $at)`,
        { id, partId, position: place + 1, by: this.enteredBy, at: ENTERED_AT },
      );
    }
    return id;
  }

  /** One more source at the end of a company part number's list. */
  async addSource(number: string, partId: number): Promise<void> {
    await this.run(
      `INSERT INTO approved_sources (company_part_number_id, part_id, position, added_by, added_at)
        SELECT id, $partId, (SELECT count(*) + 1 FROM approved_sources WHERE company_part_number_id = c.id), $by, $at
        FROM company_part_numbers AS c WHERE number = $number`,
      { number, partId, by: this.enteredBy, at: ENTERED_AT },
    );
  }

  /** An offer from 1 piece on, at a price in EUR for 1 and for 1000 pieces. */
  async offer(
    partId: number,
    choice: { from?: string; until?: string; price?: number } = {},
  ): Promise<number> {
    await this.run(`INSERT OR IGNORE INTO suppliers (code, name) VALUES ('GULL', 'Gull Trading')`, {});
    const id = await this.insert('offers', {
      part_id: partId,
      supplier_id: 1,
      packaging_code: 'T5',
      minimum_order: 1,
      order_multiple: 1,
      lead_time_days: 30,
      valid_from: choice.from ?? '2026-01-01',
      valid_until: choice.until ?? '2099-12-31',
      ...this.entered(),
    });
    const price = (choice.price ?? 0.01) * 1e6;
    for (const [quantity, factor] of [
      [1, 3],
      [1000, 1],
    ] as const) {
      await this.run('INSERT INTO offer_price_breaks VALUES ($id, $quantity, $micro)', {
        id,
        quantity,
        micro: Math.round(price * factor),
      });
    }
    return id;
  }

  /** Sets a part to where a test wants it, past every door, with nothing to be reviewed. */
  async stand(partId: number, approval: Approval, supply: SupplyStatus): Promise<void> {
    const restricted = approval === 'restricted';
    await this.run(
      `UPDATE parts SET approval = $approval, supply = $supply, restriction_words = $words, restriction_scope = NULL,
        last_order_on = NULL WHERE id = $partId`,
      { partId, approval, supply, words: restricted ? 'Not above half of the rated dissipation.' : null },
    );
    await this.run(
      `UPDATE reviews SET state = 'closed', closed_by = opened_by, closed_at = opened_at
        WHERE part_id = $partId AND state = 'open'`,
      { partId },
    );
    await this.rebuild();
  }

  /** Brings the derived columns to what was built. */
  async rebuild(): Promise<void> {
    await this.writer.transaction((transaction) =>
      rebuildDerivedColumns(this.writer, transaction, 'all', this.today),
    );
  }

  private entered(by = this.enteredBy): Columns {
    return { entered_by: by, entered_at: ENTERED_AT };
  }

  private async insert(table: string, columns: Columns): Promise<number> {
    return this.writer.transaction((transaction) => this.add(transaction, table, columns));
  }

  private async add(transaction: Transaction, table: string, columns: Columns): Promise<number> {
    const names = Object.keys(columns);
    return this.writer.insert(
      transaction,
      `INSERT INTO ${table} (${names.join(', ')}) VALUES (${names.map((name) => `$${name}`).join(', ')})`,
      columns,
    );
  }

  private async run(sql: string, bind: Columns): Promise<void> {
    await this.writer.transaction((transaction) => this.writer.run(transaction, sql, bind));
  }
}
