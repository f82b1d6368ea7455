import { Injectable } from '@nestjs/common';
import { NotFoundProblem } from '../../common/problems/problems';
import { Readers } from '../../database/readers';
import { modesOfPart, type SizeRatings } from '../ratings/size-ratings';
import { SizeRatingsReader } from '../ratings/size-ratings-reader';
import { PartSummaries, presentPartSummary, type PartRow } from '../summary/part-summaries';
import type { AlternateDto, AlternatesDto } from './alternates.dto';
import { differencesBetween, type Form } from './differences';
import { equalMode, type Mode } from './equal-function';

const MOST = 100;

/**
 * Parts of the same resistance that fit the same place: the same land pattern and mounting, or where the datasheet names no
 * land pattern, the same body style and size code; no wider in tolerance and temperature coefficient.
 */
const FITTING = `
  WITH own AS (SELECT p.*, r.land_pattern, r.mounting, r.body_style, s.code, s.metric_code
      FROM parts AS p JOIN families AS f ON f.id = p.family_id JOIN sizes AS s ON s.id = p.size_id
        JOIN size_ratings AS r ON r.revision_id = f.current_revision_id AND r.size_id = p.size_id
      WHERE p.id = $partId),
    fitting AS (SELECT s.id FROM own, sizes AS s JOIN families AS f ON f.id = s.family_id
        JOIN size_ratings AS r ON r.revision_id = f.current_revision_id AND r.size_id = s.id
      WHERE r.mounting = own.mounting AND CASE WHEN own.land_pattern IS NULL
        THEN r.land_pattern IS NULL AND r.body_style = own.body_style AND s.code = own.code
          AND s.metric_code IS own.metric_code
        ELSE r.land_pattern = own.land_pattern END)
  SELECT p.id FROM own, fitting JOIN parts AS p ON p.size_id = fitting.id
    AND p.resistance_ohm BETWEEN own.resistance_ohm * (1 - 1e-9) AND own.resistance_ohm * (1 + 1e-9)
  WHERE p.id <> own.id`;

const FORMS = `
  SELECT s.id AS size_id, r.body_style, r.termination FROM sizes AS s JOIN families AS f ON f.id = s.family_id
    JOIN size_ratings AS r ON r.revision_id = f.current_revision_id AND r.size_id = s.id
  WHERE s.id IN (SELECT value FROM json_each($sizes))`;

/** A part with what it is compared by. */
interface Compared {
  row: PartRow;
  modes: Mode[];
  form: Form;
}

/** Finds parts of equal form, fit and function. */
@Injectable()
export class Alternates {
  constructor(
    private readonly readers: Readers,
    private readonly summaries: PartSummaries,
    private readonly sizeRatings: SizeRatingsReader,
  ) {}

  /** @throws NotFoundProblem */
  async of(partId: number): Promise<AlternatesDto> {
    const fitting = await this.readers.select<{ id: number }>(FITTING, { partId });
    const rows = await this.summaries.rows([partId, ...fitting.map(({ id }) => id)]);
    const compared = await this.compared([...rows.values()]);
    const own = compared.find(({ row }) => row.id === partId);
    if (!own) throw new NotFoundProblem(`There is no part ${partId}.`);
    const equal = compared.flatMap((other) => {
      const mode = other === own ? undefined : equalMode(own.modes, other.modes);
      return mode ? [{ other, mode }] : [];
    });
    return {
      total: equal.length,
      items: equal
        .map(({ other, mode }) => ({ row: other.row, item: alternateOf(own, other, mode) }))
        .sort((one, another) => rankOf(one) - rankOf(another) || priceOf(one.row) - priceOf(another.row))
        .slice(0, MOST)
        .map(({ item }) => item),
    };
  }

  private async compared(rows: readonly PartRow[]): Promise<Compared[]> {
    const sizeIds = rows.map(({ size_id: sizeId }) => sizeId);
    const ratings = await this.sizeRatings.ofSizes(sizeIds);
    const forms = await this.readers.select<{
      size_id: number;
      body_style: string;
      termination: string | null;
    }>(FORMS, { sizes: JSON.stringify([...new Set(sizeIds)]) });
    return rows.flatMap((row) => {
      const size = ratings.get(row.size_id);
      const form = forms.find(({ size_id: sizeId }) => sizeId === row.size_id);
      if (!size || !form) return [];
      const { body_style: bodyStyle, termination } = form;
      return [{ row, modes: modesOf(row, size), form: { bodyStyle, termination: termination ?? undefined } }];
    });
  }
}

function modesOf(row: PartRow, size: SizeRatings): Mode[] {
  return modesOfPart(size, {
    resistance: row.resistance_ohm,
    tolerance: row.tolerance_fraction,
    tcr: row.tcr_per_kelvin,
  });
}

function alternateOf(own: Compared, other: Compared, mode: Mode): AlternateDto {
  const [ownMode] = own.modes;
  const number = own.row.company_part_number_id;
  return {
    part: presentPartSummary(other.row),
    sameCompanyPartNumber: number !== null && other.row.company_part_number_id === number,
    otherManufacturer: other.row.manufacturer_id !== own.row.manufacturer_id,
    sound: ['approved', 'preferred'].includes(other.row.approval) && other.row.supply === 'active',
    mode: mode.name,
    differences: ownMode
      ? differencesBetween(
          { ratings: ownMode.ratings, form: own.form },
          { ratings: mode.ratings, form: other.form },
        )
      : [],
  };
}

/** The same company part number counts most, then another manufacturer, then whether one may use it at once. */
function rankOf({ item }: { item: AlternateDto }): number {
  return -(Number(item.sameCompanyPartNumber) * 4 + Number(item.otherManufacturer) * 2 + Number(item.sound));
}

/** None goes last, whatever the price; among equals the order stays that of the ids. */
function priceOf(row: PartRow): number {
  return row.derived_unit_price_micro ?? Number.MAX_SAFE_INTEGER;
}
