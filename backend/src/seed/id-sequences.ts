import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';

/** Tables whose ids are given out before the rows are written, so that rows can refer to each other. */
export const numberedTables = [
  'manufacturers',
  'families',
  'datasheets',
  'family_revisions',
  'sizes',
  'size_ratings',
  'parts',
  'company_part_numbers',
  'suppliers',
  'offers',
  'derating_policies',
  'derating_policy_versions',
] as const;
export type NumberedTable = (typeof numberedTables)[number];

/** Gives out ids above those that a table holds. */
export class IdSequences {
  private constructor(private readonly last: Map<NumberedTable, number>) {}

  static async after(writer: Writer, transaction: Transaction): Promise<IdSequences> {
    const last = new Map<NumberedTable, number>();
    for (const table of numberedTables) {
      const [row] = await writer.select<{ last: number }>(
        transaction,
        `SELECT coalesce(max(id), 0) AS last FROM ${table}`,
      );
      last.set(table, row?.last ?? 0);
    }
    return new IdSequences(last);
  }

  next(table: NumberedTable): number {
    const id = (this.last.get(table) ?? 0) + 1;
    this.last.set(table, id);
    return id;
  }
}
