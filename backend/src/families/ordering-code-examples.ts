import { Injectable } from '@nestjs/common';
import { Readers } from '../database/readers';
import { orderingCode, OrderingCodeError } from '../parts/ordering-code';
import { parseOrderingCodeTemplate } from '../parts/ordering-code-template';
import type { OrderingCodeExampleDto } from './dto/family-revision.dto';

interface ExampleRow {
  size_code: string;
  resistance_ohm: number;
  tolerance_fraction: number | null;
  tcr_per_kelvin: number | null;
  packaging_code: string | null;
}

/**
 * Of the first, the middle and the last size the part whose resistance is nearest to 4.7 kΩ on a logarithmic scale, and one
 * zero-ohm link; each with the first packaging of its size in the revision.
 */
const examplesSql = `
  WITH ordered AS (SELECT id, code, row_number() OVER (ORDER BY position) AS place, count(*) OVER () AS sizes
      FROM sizes WHERE family_id = $familyId),
    chosen AS (SELECT id, code, place FROM ordered WHERE place IN (1, (sizes + 1) / 2, sizes)),
    example AS (
      SELECT (SELECT p.id FROM parts AS p WHERE p.size_id = chosen.id AND p.resistance_ohm > 0
        ORDER BY abs(ln(p.resistance_ohm / 4700)), p.id LIMIT 1) AS part_id, place FROM chosen
      UNION ALL
      SELECT min(id), 1000000 FROM parts WHERE family_id = $familyId AND resistance_ohm = 0)
  SELECT z.code AS size_code, p.resistance_ohm, p.tolerance_fraction, p.tcr_per_kelvin,
    (SELECT k.code FROM packagings AS k WHERE k.revision_id = $revisionId AND k.size_id = z.id
      ORDER BY k.quantity, k.code LIMIT 1) AS packaging_code
  FROM example JOIN parts AS p ON p.id = example.part_id JOIN sizes AS z ON z.id = p.size_id ORDER BY example.place`;

/** Shows by parts of the family what its ordering-code template makes. */
@Injectable()
export class OrderingCodeExamples {
  constructor(private readonly readers: Readers) {}

  async of(
    family: { id: number; code: string },
    revision: { id: number; template: string },
  ): Promise<OrderingCodeExampleDto[]> {
    const parsed = parseOrderingCodeTemplate(revision.template);
    if (!parsed.ok) return [];
    const rows = await this.readers.select<ExampleRow>(examplesSql, {
      familyId: family.id,
      revisionId: revision.id,
    });
    return rows.flatMap((row): OrderingCodeExampleDto[] => {
      const part = {
        familyCode: family.code,
        sizeCode: row.size_code,
        resistance: row.resistance_ohm,
        tolerance: row.tolerance_fraction,
        tcr: row.tcr_per_kelvin,
        packagingCode: row.packaging_code ?? undefined,
      };
      try {
        return [
          {
            code: orderingCode(parsed.template, part),
            size: row.size_code,
            resistance: row.resistance_ohm,
            tolerance: row.tolerance_fraction ?? undefined,
            tcr: row.tcr_per_kelvin ?? undefined,
            packaging: row.packaging_code ?? undefined,
          },
        ];
      } catch (error) {
        // A template of another revision need not be able to write every part of today.
        if (error instanceof OrderingCodeError) return [];
        throw error;
      }
    });
  }
}
