import { Injectable } from '@nestjs/common';
import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import { Readers } from '../../database/readers';
import { orderingCode, OrderingCodeError, type OrderedPart } from '../ordering-code';
import { parseOrderingCodeTemplate } from '../ordering-code-template';
import type { OrderingCodeDto, SourceDto } from './purchasing.dto';

interface SourceRow {
  id: number;
  manufacturer_part_number: string;
  manufacturer_id: number;
  manufacturer_code: string;
  manufacturer_name: string;
  family_id: number;
  family_code: string;
  family_name: string;
  position: number;
  approval: Approval;
  supply: SupplyStatus;
  derived_unit_price_micro: number | null;
  last_order_on: string | null;
}

/** Reading under what numbers, and as which parts it can be bought. */
@Injectable()
export class PartPurchasingReading {
  constructor(private readonly readers: Readers) {}

  /** The approved manufacturer list of a company part number, in its order. */
  async sources(companyPartNumberId: number): Promise<SourceDto[]> {
    const rows = await this.readers.select<SourceRow>(
      `SELECT p.id, p.manufacturer_part_number, m.id AS manufacturer_id, m.code AS manufacturer_code,
          m.name AS manufacturer_name, f.id AS family_id, f.code AS family_code, f.name AS family_name, a.position,
          p.approval, p.supply, p.derived_unit_price_micro, p.last_order_on
        FROM approved_sources AS a JOIN parts AS p ON p.id = a.part_id JOIN families AS f ON f.id = p.family_id
          JOIN manufacturers AS m ON m.id = f.manufacturer_id
        WHERE a.company_part_number_id = $companyPartNumberId ORDER BY a.position, p.id`,
      { companyPartNumberId },
    );
    return rows.map((row) => ({
      id: row.id,
      manufacturerPartNumber: row.manufacturer_part_number,
      manufacturer: { id: row.manufacturer_id, code: row.manufacturer_code, name: row.manufacturer_name },
      family: { id: row.family_id, code: row.family_code, name: row.family_name },
      position: row.position,
      approval: row.approval,
      supply: row.supply,
      unitPrice: row.derived_unit_price_micro === null ? undefined : row.derived_unit_price_micro / 1e6,
      lastOrderOn: row.last_order_on ?? undefined,
    }));
  }

  /** One a packaging of the part's size; the code is absent where the family's template cannot write it. */
  async orderingCodes(
    revision: { id: number; template: string },
    sizeId: number,
    part: Omit<OrderedPart, 'packagingCode'>,
  ): Promise<OrderingCodeDto[]> {
    const packagings = await this.readers.select<{ code: string; description: string; quantity: number }>(
      `SELECT code, description, quantity FROM packagings WHERE revision_id = $revisionId AND size_id = $sizeId
        ORDER BY quantity, code`,
      { revisionId: revision.id, sizeId },
    );
    return packagings.map(({ code, description, quantity }) => ({
      packaging: code,
      description,
      quantity,
      code: codeOf(revision.template, { ...part, packagingCode: code }),
    }));
  }
}

function codeOf(template: string, part: OrderedPart): string | undefined {
  const parsed = parseOrderingCodeTemplate(template);
  if (!parsed.ok) return undefined;
  try {
    return orderingCode(parsed.template, part);
  } catch (error) {
    if (error instanceof OrderingCodeError) return undefined;
    throw error;
  }
}
