import type { Transaction } from 'sequelize';
import type { BindValues } from '../database/bind-values';
import type { Writer } from '../database/writer';

/** Which parts to rebuild: all, or these and the sources under the same company part numbers. */
export type DerivedScope = 'all' | readonly number[];

/** The parts of the scope: a change of one source changes whether the others have a second source. */
const SCOPE = `WITH given (id) AS MATERIALIZED (SELECT value FROM json_each($partIds)),
  scope (id) AS MATERIALIZED (
    SELECT id FROM given
    UNION
    SELECT other.part_id FROM given
      JOIN approved_sources AS own ON own.part_id = given.id
      JOIN approved_sources AS other ON other.company_part_number_id = own.company_part_number_id)`;

/** Row of the range table of the family's current revision that holds the part; none for links. */
const RANGE = `(SELECT min(r.id) FROM families AS f
    JOIN ranges AS r ON r.revision_id = f.current_revision_id AND r.size_id = parts.size_id
  WHERE f.id = parts.family_id AND r.tolerance_fraction = parts.tolerance_fraction
    AND r.tcr_per_kelvin IS parts.tcr_per_kelvin
    AND parts.resistance_ohm BETWEEN r.resistance_min_ohm AND r.resistance_max_ohm)`;

/**
 * Lowest unit price at 1000 pieces among the offers in force today that sell as few: of each, the price of its largest
 * break up to 1000. Stands in a statement over `parts` and binds today's day.
 */
export const PRICE = `(SELECT min((SELECT b.unit_price_micro FROM offer_price_breaks AS b
      WHERE b.offer_id = o.id AND b.quantity <= 1000 ORDER BY b.quantity DESC LIMIT 1))
  FROM offers AS o
  WHERE o.part_id = parts.id AND o.ended_at IS NULL AND o.minimum_order <= 1000 AND $today BETWEEN o.valid_from AND o.valid_until)`;

/** Another manufacturer's approved or preferred and active part stands under the same company part number. */
const SECOND_SOURCE = `EXISTS (SELECT 1 FROM approved_sources AS own
    JOIN approved_sources AS other ON other.company_part_number_id = own.company_part_number_id
      AND other.part_id <> own.part_id
    JOIN parts AS p ON p.id = other.part_id
    JOIN families AS f ON f.id = p.family_id
  WHERE own.part_id = parts.id AND p.approval IN ('approved', 'preferred') AND p.supply = 'active'
    AND f.manufacturer_id <> (SELECT manufacturer_id FROM families WHERE id = parts.family_id))`;

const TEXT = `SELECT parts.id, parts.manufacturer_part_number, coalesce(c.number, ''), f.code || ' ' || f.name, m.name
  FROM parts JOIN families AS f ON f.id = parts.family_id JOIN manufacturers AS m ON m.id = f.manufacturer_id
    LEFT JOIN approved_sources AS s ON s.part_id = parts.id
    LEFT JOIN company_part_numbers AS c ON c.id = s.company_part_number_id`;

/**
 * Rebuilds what is stored only so that searches can sort and filter by it: the range row, the price at 1000 pieces, the
 * second source and the text index. Call it in the transaction that changed what they follow from, and nightly, because
 * prices also change with the day.
 *
 * @param today day as 2026-12-01; offers count that are valid on it
 * @returns how many parts were rebuilt
 */
export async function rebuildDerivedColumns(
  writer: Writer,
  transaction: Transaction,
  scope: DerivedScope,
  today: string,
): Promise<number> {
  if (scope !== 'all' && scope.length === 0) return 0;
  const all = scope === 'all';
  const bind: BindValues = all ? {} : { partIds: JSON.stringify(scope) };
  const inScope = (column: string): string => (all ? '' : ` WHERE ${column} IN (SELECT id FROM scope)`);
  const prefix = all ? '' : `${SCOPE} `;
  const rebuilt = await writer.run(
    transaction,
    `${prefix}UPDATE parts SET derived_range_id = ${RANGE}, derived_unit_price_micro = ${PRICE},
       derived_second_source = ${SECOND_SOURCE}${inScope('parts.id')}`,
    { ...bind, today },
  );
  await writer.run(transaction, `${prefix}DELETE FROM part_text${inScope('rowid')}`, bind);
  await writer.run(
    transaction,
    `${all ? '' : SCOPE} INSERT INTO part_text (rowid, manufacturer_part_number, company_part_number, family, manufacturer)
     ${TEXT}${inScope('parts.id')}`,
    bind,
  );
  return rebuilt;
}
