import type { SeriesName } from '@resistry/engineering/preferred-values/series';
import { ratingsOfRow } from '../parts/ratings/size-ratings-row';
import type { SizeRefDto } from '../parts/summary/part-summary.dto';
import type {
  FamilySizeDto,
  OperatingModeDto,
  PackagingDto,
  RangeDto,
  RevisionRefDto,
} from './dto/family-revision.dto';
import type { PackagingRow, RangeRow, RevisionRow, RevisionSizeRow } from './revision-rows';

export function presentRevisionRef(row: RevisionRow): RevisionRefDto {
  return {
    number: row.number,
    state: row.state,
    current: row.current === 1,
    description: row.description,
    enteredBy: { id: row.entered_by, name: row.entered_by_name },
    enteredAt: row.entered_at,
    publishedBy:
      row.published_by === null || row.published_by_name === null
        ? undefined
        : { id: row.published_by, name: row.published_by_name },
    publishedAt: row.published_at ?? undefined,
  };
}

/** @param rows one row an operating mode, those of a size together */
export function presentSizes(rows: readonly RevisionSizeRow[]): FamilySizeDto[] {
  const sizes: FamilySizeDto[] = [];
  for (const row of rows) {
    const last = sizes.at(-1);
    if (last?.size.id === row.size_id) last.modes.push(presentMode(row));
    else sizes.push(presentSize(row));
  }
  return sizes;
}

export function presentRange(row: RangeRow): RangeDto {
  return {
    size: sizeRef(row),
    tolerance: row.tolerance_fraction,
    tcr: row.tcr_per_kelvin ?? undefined,
    min: row.resistance_min_ohm,
    max: row.resistance_max_ohm,
    series: JSON.parse(row.series) as SeriesName[],
  };
}

export function presentPackaging(row: PackagingRow): PackagingDto {
  return { size: sizeRef(row), code: row.code, description: row.description, quantity: row.quantity };
}

function presentSize(row: RevisionSizeRow): FamilySizeDto {
  return {
    size: sizeRef(row),
    bodyStyle: row.body_style,
    body: ratingsOfRow(row).body,
    mounting: row.mounting ?? undefined,
    landPattern: row.land_pattern ?? undefined,
    termination: row.termination ?? undefined,
    soldering: row.soldering ?? undefined,
    parts: row.parts,
    modes: [presentMode(row)],
  };
}

/** What belongs to a part and not to its size is left out. */
function presentMode(row: RevisionSizeRow): OperatingModeDto {
  const ratings: Partial<ReturnType<typeof ratingsOfRow>> = ratingsOfRow(row);
  delete ratings.resistance;
  delete ratings.certificates;
  return { name: row.mode_name, ratings: { ...ratings, technology: row.technology } };
}

function sizeRef(row: { size_id: number; size_code: string; metric_code: string | null }): SizeRefDto {
  return { id: row.size_id, code: row.size_code, metricCode: row.metric_code ?? undefined };
}
