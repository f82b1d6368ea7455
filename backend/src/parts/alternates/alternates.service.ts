import { Injectable } from '@nestjs/common';
import { NotFoundProblem } from '../../common/problems/problems';
import { Readers } from '../../database/readers';
import { modesOfPart } from '../ratings/size-ratings';
import { SizeRatingsReader } from '../ratings/size-ratings-reader';
import { PartSummaries, presentPartSummary, type PartRow } from '../summary/part-summaries';
import type { AlternateDto, AlternatesDto } from './alternates.dto';
import { compareFit, type Fit } from './compare-fit';
import { compareFunction, type Mode } from './compare-function';
import { differencesBetween, type Form } from './differences';
import { fittingPartsSql, type FormOfSize, formsOfSizesSql } from './fitting-parts';
import { judgementOf } from './shortfall';

const MOST = 100;

/** A part with what it is compared by. */
interface Compared {
  row: PartRow;
  modes: Mode[];
  form: Form;
  fit: Fit;
}

/** Finds what may replace a part, and judges it. */
@Injectable()
export class Alternates {
  constructor(
    private readonly readers: Readers,
    private readonly summaries: PartSummaries,
    private readonly sizeRatings: SizeRatingsReader,
  ) {}

  /**
   * Every part under the same company part number, equal or not, and of the others those that are equal or of which a rating
   * that counts is not stated.
   *
   * @throws NotFoundProblem
   */
  async of(partId: number): Promise<AlternatesDto> {
    const fitting = await this.readers.select<{ id: number }>(fittingPartsSql, { partId });
    const rows = await this.summaries.rows([partId, ...fitting.map(({ id }) => id)]);
    const compared = await this.compared([...rows.values()]);
    const own = compared.find(({ row }) => row.id === partId);
    if (!own) throw new NotFoundProblem(`There is no part ${partId}.`);
    const found = compared
      .filter((other) => other !== own)
      .flatMap((other) => ({ row: other.row, item: alternateOf(own, other) }))
      .filter(
        (each): each is { row: PartRow; item: AlternateDto } =>
          each.item !== undefined && (each.item.sameCompanyPartNumber || each.item.judgement !== 'lesser'),
      );
    return {
      total: found.length,
      items: found
        .sort(
          (one, another) =>
            rankOf(one.item) - rankOf(another.item) || priceOf(one.row) - priceOf(another.row),
        )
        .slice(0, MOST)
        .map(({ item }) => item),
    };
  }

  private async compared(rows: readonly PartRow[]): Promise<Compared[]> {
    const sizeIds = rows.map(({ size_id: sizeId }) => sizeId);
    const ratings = await this.sizeRatings.ofSizes(sizeIds);
    const forms = await this.readers.select<FormOfSize>(formsOfSizesSql, {
      sizes: JSON.stringify([...new Set(sizeIds)]),
    });
    return rows.flatMap((row) => {
      const size = ratings.get(row.size_id);
      const form = forms.find(({ size_id: sizeId }) => sizeId === row.size_id);
      if (!size || !form) return [];
      const { resistance_ohm: resistance, tolerance_fraction: tolerance, tcr_per_kelvin: tcr } = row;
      return [
        {
          row,
          modes: modesOfPart(size, { resistance, tolerance, tcr }),
          form: { bodyStyle: form.body_style, termination: form.termination ?? undefined },
          fit: fitOf(row, form),
        },
      ];
    });
  }
}

function fitOf(row: PartRow, form: FormOfSize): Fit {
  return {
    resistance: row.resistance_ohm,
    mounting: row.mounting ?? undefined,
    landPattern: form.land_pattern ?? undefined,
    bodyStyle: form.body_style,
    sizeCode: row.size_code,
    metricCode: row.metric_code ?? undefined,
  };
}

/** @returns undefined where one of the two has no ratings to be compared by */
function alternateOf(own: Compared, other: Compared): AlternateDto | undefined {
  const comparison = compareFunction(own.modes, other.modes);
  const [ownMode] = own.modes;
  if (!comparison || !ownMode) return undefined;
  const { mode } = comparison;
  const shortfalls = [...compareFit(own.fit, other.fit), ...comparison.shortfalls];
  const number = own.row.company_part_number_id;
  return {
    part: presentPartSummary(other.row),
    sameCompanyPartNumber: number !== null && other.row.company_part_number_id === number,
    otherManufacturer: other.row.manufacturer_id !== own.row.manufacturer_id,
    sound: ['approved', 'preferred'].includes(other.row.approval) && other.row.supply === 'active',
    mode: mode.name,
    judgement: judgementOf(shortfalls),
    shortfalls,
    differences: differencesBetween(
      { ratings: ownMode.ratings, form: own.form },
      { ratings: mode.ratings, form: other.form },
    ),
  };
}

/** The same company part number counts most, then equality, then another manufacturer, then whether one may use it at once. */
function rankOf(item: AlternateDto): number {
  return -(
    Number(item.sameCompanyPartNumber) * 8 +
    Number(item.judgement === 'equal') * 4 +
    Number(item.otherManufacturer) * 2 +
    Number(item.sound)
  );
}

/** None goes last, whatever the price; among equals the order stays that of the ids. */
function priceOf(row: PartRow): number {
  return row.derived_unit_price_micro ?? Number.MAX_SAFE_INTEGER;
}
