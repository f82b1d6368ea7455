/** An offer as the audit trail keeps it: whole, so that an entry can be read by itself. */
export interface OfferRecord {
  part: string;
  supplier: string;
  packaging: string;
  minimumOrder: number;
  orderMultiple: number;
  leadTimeDays: number;
  validFrom: string;
  validUntil: string;
  /** `1000 at 0.0069 EUR`, rising by quantity */
  prices: string[];
  endedAt?: string;
}

export interface OfferRecordRow {
  part_id: number;
  part: string;
  supplier: string;
  packaging_code: string;
  minimum_order: number;
  order_multiple: number;
  lead_time_days: number;
  valid_from: string;
  valid_until: string;
  ended_at: string | null;
  version: number;
  prices: string;
}

/** Prices of the offer `o` as texts. */
export const pricesSql = `(SELECT json_group_array(b.quantity || ' at ' || (b.unit_price_micro / 1e6) || ' EUR')
  FROM (SELECT quantity, unit_price_micro FROM offer_price_breaks WHERE offer_id = o.id ORDER BY quantity) AS b)`;

export const offerRecordSql = `
  SELECT o.part_id, p.manufacturer_part_number AS part, s.name AS supplier, o.packaging_code, o.minimum_order,
    o.order_multiple, o.lead_time_days, o.valid_from, o.valid_until, o.ended_at, o.version, ${pricesSql} AS prices
  FROM offers AS o JOIN parts AS p ON p.id = o.part_id JOIN suppliers AS s ON s.id = o.supplier_id WHERE o.id = $id`;

export function recordOf(row: OfferRecordRow): OfferRecord {
  return {
    part: row.part,
    supplier: row.supplier,
    packaging: row.packaging_code,
    minimumOrder: row.minimum_order,
    orderMultiple: row.order_multiple,
    leadTimeDays: row.lead_time_days,
    validFrom: row.valid_from,
    validUntil: row.valid_until,
    prices: JSON.parse(row.prices) as string[],
    ...(row.ended_at !== null && { endedAt: row.ended_at }),
  };
}
