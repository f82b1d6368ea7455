import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import type { OfferDto, PriceBreakDto } from './dto/offer.dto';

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
  ended_at: string | null;
  version: number;
  entered_by: number;
  entered_by_name: string;
  entered_at: string;
  price_breaks: string;
}

/** Binds today's day; the WHERE clause follows. */
const OFFERS = `
  SELECT o.id, s.id AS supplier_id, s.code AS supplier_code, s.name AS supplier_name, o.packaging_code, o.currency,
    o.minimum_order, o.order_multiple, o.lead_time_days, o.valid_from, o.valid_until, o.ended_at, o.version,
    o.ended_at IS NULL AND $today BETWEEN o.valid_from AND o.valid_until AS in_force, o.entered_by,
    u.name AS entered_by_name, o.entered_at,
    (SELECT json_group_array(json_object('quantity', quantity, 'unitPrice', unit_price_micro / 1e6))
      FROM (SELECT quantity, unit_price_micro FROM offer_price_breaks WHERE offer_id = o.id ORDER BY quantity)) AS price_breaks
  FROM offers AS o JOIN suppliers AS s ON s.id = o.supplier_id JOIN users AS u ON u.id = o.entered_by`;

/** Reading at what price, from whom and when a part can be bought. */
@Injectable()
export class OfferReading {
  constructor(
    private readonly readers: Readers,
    private readonly clock: Clock,
  ) {}

  /** Those in force first, then the latest. */
  async ofPart(partId: number): Promise<OfferDto[]> {
    const rows = await this.readers.select<OfferRow>(
      `${OFFERS} WHERE o.part_id = $partId ORDER BY in_force DESC, o.valid_until DESC, s.name, o.id`,
      { partId, today: this.clock.today() },
    );
    return rows.map(presentOffer);
  }

  /** @throws NotFoundProblem */
  async find(id: number): Promise<OfferDto> {
    const today = this.clock.today();
    const row = await this.readers.lookUp<OfferRow>(`${OFFERS} WHERE o.id = $id`, { id, today });
    if (!row) throw new NotFoundProblem(`There is no offer ${id}.`);
    return presentOffer(row);
  }
}

function presentOffer(row: OfferRow): OfferDto {
  return {
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
    endedAt: row.ended_at ?? undefined,
    version: row.version,
  };
}
