import { Injectable, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { Cron, CronExpression } from '@nestjs/schedule';
import { Readers } from '../database/readers';
import type { SizeRatings } from '../parts/ratings/size-ratings';
import { SizeRatingsReader } from '../parts/ratings/size-ratings-reader';
import { StandingChanges } from '../parts/standing-changes';
import type { SearchPlan, SearchResult } from './engine/search-plan';
import { InlineSearchHost } from './host/inline-search-host';
import type { SearchHost } from './host/search-host';
import { ThreadSearchHost } from './host/thread-search-host';
import { buildIndex, fillStanding } from './index/build-index';
import type { CatalogueIndex } from './index/catalogue-index';
import type { PartColumnsRow } from './index/part-columns-row';

type StandingRow = Pick<
  PartColumnsRow,
  'id' | 'approval' | 'supply' | 'derived_second_source' | 'derived_unit_price_micro'
>;

const standingSql = `
  SELECT id, approval, supply, derived_second_source, derived_unit_price_micro
  FROM parts WHERE id IN (SELECT value FROM json_each($ids))`;

/** The catalogue in memory, kept to the database: built when first asked for, and told of every change of a standing. */
@Injectable()
export class SearchIndex implements OnModuleInit, OnApplicationShutdown {
  private readonly host: SearchHost = __filename.endsWith('.ts')
    ? new InlineSearchHost()
    : new ThreadSearchHost();
  private current?: CatalogueIndex;
  private building?: Promise<CatalogueIndex>;
  /** Parts whose standing changed while the catalogue was read: theirs may have been read before or after. */
  private readonly changedMeanwhile = new Set<number>();

  constructor(
    private readonly readers: Readers,
    private readonly sizeRatings: SizeRatingsReader,
    private readonly standingChanges: StandingChanges,
  ) {}

  onModuleInit(): void {
    this.standingChanges.subscribe((partIds) => this.refreshStanding(partIds));
  }

  /** @param gone aborted when nobody waits for the answer any more */
  async search(plan: SearchPlan, gone?: AbortSignal): Promise<SearchResult> {
    await this.ready();
    return this.host.search(plan, gone);
  }

  /** The ratings that the index was built with. */
  async ratings(): Promise<ReadonlyMap<number, SizeRatings>> {
    const { ratings } = await this.ready();
    return ratings;
  }

  /** Builds the index if it is not built; a failed build is tried again at the next call. */
  async ready(): Promise<CatalogueIndex> {
    return this.current ?? (await this.rebuild());
  }

  /** Reads the whole catalogue again: after parts, ratings or company part numbers have come or gone, and each day. */
  @Cron(CronExpression.EVERY_DAY_AT_1AM)
  async rebuild(): Promise<CatalogueIndex> {
    this.building ??= this.build().finally(() => (this.building = undefined));
    return this.building;
  }

  /** Reads the standing of parts again after a change was committed, so that the next search shows it. */
  async refreshStanding(partIds: readonly number[]): Promise<void> {
    if (this.building !== undefined) for (const id of partIds) this.changedMeanwhile.add(id);
    if (this.current !== undefined) await this.readStanding(this.current, partIds);
    else await this.building;
  }

  async onApplicationShutdown(): Promise<void> {
    await this.host.close();
  }

  private async build(): Promise<CatalogueIndex> {
    this.changedMeanwhile.clear();
    const index = await buildIndex(this.readers, await this.sizeRatings.all());
    while (this.changedMeanwhile.size > 0) {
      const changed = [...this.changedMeanwhile];
      this.changedMeanwhile.clear();
      await this.readStanding(index, changed);
    }
    // No waiting from here on: a change is either in the set above or finds the new index.
    this.host.take(index);
    this.current = index;
    return index;
  }

  private async readStanding({ columns }: CatalogueIndex, partIds: readonly number[]): Promise<void> {
    const rows = await this.readers.select<StandingRow>(standingSql, { ids: JSON.stringify(partIds) });
    for (const row of rows) {
      const position = columns.positionOfId[row.id] ?? -1;
      if (position >= 0) fillStanding(columns, position, row);
    }
  }
}
