import type { NestExpressApplication } from '@nestjs/platform-express';
import type { Transaction } from 'sequelize';
import type { BindValues } from '../../src/database/bind-values';
import { Writer } from '../../src/database/writer';
import { familyRows, type FilledFamily } from '../../src/seed/family-rows';
import { IdSequences } from '../../src/seed/id-sequences';
import { insertFamilies } from '../../src/seed/insert-families';
import { insertRows } from '../../src/seed/insert-rows';
import { readFamily } from '../../src/seed/reading/read-family';

const deed = (by: string): object => ({ by, on: '2026-01-05' });

/** A family's file with one size; `changes` go over it. */
export function smallFamilyFile(code: string, manufacturer: string, changes: object = {}): object {
  return {
    code,
    manufacturer,
    name: 'Chip of a test',
    technology: 'thick-film',
    entered: deed('enterer'),
    datasheets: [{ document: `DOC-${code}`, revision: '1', issued: '2025-11-03', pages: 4, title: 'Chips' }],
    declarations: [],
    certificates: [],
    sizes: [{ code: '0603', metric: '1608M' }],
    examples: [],
    revisions: [
      {
        number: 1,
        description: 'First',
        datasheet: `DOC-${code} 1`,
        entered: deed('enterer'),
        published: deed('publisher'),
        features: [],
        failureRateStyle: 'RM',
        orderingCode: '{family}{size}{tolerance}{tcr:ppm}{resistance:four}',
        common: {},
        sizes: {
          '0603': {
            bodyStyle: 'chip',
            mounting: 'surface',
            link: { ratedCurrent: '1 A', residualResistance: '50 mΩ' },
            modes: [{ name: 'standard', dissipation: '0.1 W' }],
          },
        },
        ranges: [
          { sizes: ['0603'], tolerance: '1 %', tcr: '100 ppm/K', span: ['100 Ω', '330 Ω'], series: ['E6'] },
          { sizes: ['0603'], tolerance: '1 %', tcr: '200 ppm/K', span: ['100 Ω', '150 Ω'], series: ['E6'] },
          { sizes: ['0603'], tolerance: '5 %', tcr: '200 ppm/K', span: ['100 Ω', '330 Ω'], series: ['E3'] },
        ],
        packagings: [{ sizes: ['0603'], code: 'T', description: 'tape', quantity: 5000 }],
        citations: [],
        lacks: {
          ...Object.fromEntries(
            [
              'limitingElementVoltage',
              'overloadVoltage',
              'insulationVoltage',
              'voltageCoefficient',
              'noiseIndex',
              'inductance',
              'capacitance',
              'solderShift',
              'humidityShift',
              'landPattern',
              'termination',
              'soldering',
              'maxElementTemperature',
              'thermalResistance',
              'derating',
              'drift',
              'body',
              'category',
              'pulses',
            ].map((rating) => [rating, 'all']),
          ),
        },
      },
    ],
    ...changes,
  };
}

/** A catalogue of a few families, to be changed by SQL. */
export class SmallCatalogue {
  private constructor(
    readonly writer: Writer,
    readonly personId: number,
    readonly families: readonly FilledFamily[],
  ) {}

  static async in(application: NestExpressApplication, personId: number): Promise<SmallCatalogue> {
    const writer = application.get(Writer);
    const families = await writer.transaction(async (transaction) => {
      const ids = await IdSequences.after(writer, transaction);
      const makers = ['North', 'South'].map((name) => ({
        id: ids.next('manufacturers'),
        code: name.toUpperCase(),
        name: `${name} Works`,
        entered_by: personId,
        entered_at: '2026-01-05T09:00:00.000Z',
      }));
      await insertRows(writer, transaction, 'manufacturers', makers);
      const filled = [
        ['TSTA', 0],
        ['TSTB', 1],
        ['TSTC', 0],
      ].map(([code, maker]) => {
        const manufacturer = makers[Number(maker)];
        const file = smallFamilyFile(String(code), manufacturer?.code ?? '');
        const family = readFamily(`${String(code)}.json`, file);
        return familyRows(family, { manufacturerId: manufacturer?.id ?? NaN, personId: () => personId, ids });
      });
      await insertFamilies(writer, transaction, filled);
      return filled;
    });
    return new SmallCatalogue(writer, personId, families);
  }

  /** Id of a part by its number. */
  part(manufacturerPartNumber: string): number {
    const part = this.families
      .flatMap((family) => family.parts)
      .find((candidate) => candidate.manufacturerPartNumber === manufacturerPartNumber);
    if (!part) throw new Error(`There is no ${manufacturerPartNumber}.`);
    return part.id;
  }

  async run(sql: string, bind: BindValues = {}): Promise<void> {
    await this.within((transaction) => this.writer.run(transaction, sql, bind));
  }

  async select<Row extends object>(sql: string, bind: BindValues = {}): Promise<Row[]> {
    return this.within((transaction) => this.writer.select<Row>(transaction, sql, bind));
  }

  async within<Result>(work: (transaction: Transaction) => Promise<Result>): Promise<Result> {
    return this.writer.transaction(work);
  }
}
