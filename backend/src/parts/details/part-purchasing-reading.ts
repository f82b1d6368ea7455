import { Injectable } from '@nestjs/common';
import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import { Clock } from '../../common/clock';
import { Readers } from '../../database/readers';
import { orderingCode, OrderingCodeError, type OrderedPart } from '../ordering-code';
import { parseOrderingCodeTemplate } from '../ordering-code-template';
import type { OfferDto, OrderingCodeDto, PriceBreakDto, SourceDto } from './purchasing.dto';

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

interface OfferRow {
  id: number;
  supplier_id: number;
  supplier_code: string;
  supplier_name: string;
  packaging_code: string;
  currency: 'EUR';
  minimum_order: number;
  order_multiple: number;
  lead_time_days: number;
  valid_from: string;
  valid_until: string;
  in_force: number;
  entered_by: number;
  entered_by_name: string;
  entered_at: string;
  price_breaks: string;
}

const OFFERS = `
  SELECT o.id, s.id AS supplier_id, s.code AS supplier_code, s.name AS supplier_name, o.packaging_code, o.currency,
    o.minimum_order, o.order_multiple, o.lead_time_days, o.valid_from, o.valid_until,
    $today BETWEEN o.valid_from AND o.valid_until AS in_force, o.entered_by, u.name AS entered_by_name, o.entered_at,
    (SELECT json_group_array(json_object('quantity', quantity, 'unitPrice', unit_price_micro / 1e6))
      FROM (SELECT quantity, unit_price_micro FROM offer_price_breaks WHERE offer_id = o.id ORDER BY quantity)) AS price_breaks
  FROM offers AS o JOIN suppliers AS s ON s.id = o.supplier_id JOIN users AS u ON u.id = o.entered_by
  WHERE o.part_id = $partId ORDER BY in_force DESC, o.valid_until DESC, s.name, o.id`;

/** Reading under what numbers, from whom and at what price a part can be bought. */
@Injectable()
export class PartPurchasingReading {
  constructor(
    private readonly readers: Readers,
    private readonly clock: Clock,
  ) {}

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

  async offers(partId: number): Promise<OfferDto[]> {
    const rows = await this.readers.select<OfferRow>(OFFERS, { partId, today: this.clock.today() });
    return rows.map((row) => ({
      id: row.id,
      supplier: { id: row.supplier_id, code: row.supplier_code, name: row.supplier_name },
      packaging: row.packaging_code,
      currency: row.currency,
      minimumOrder: row.minimum_order,
      orderMultiple: row.order_multiple,
      leadTimeDays: row.lead_time_days,
      validFrom: row.valid_from,
      validUntil: row.valid_until,
      inForce: row.in_force === 1,
      priceBreaks: JSON.parse(row.price_breaks) as PriceBreakDto[],
      enteredBy: { id: row.entered_by, name: row.entered_by_name },
      enteredAt: row.entered_at,
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
