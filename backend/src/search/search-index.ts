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
  private building?: Promise<{ index: CatalogueIndex; positions: ReadonlyMap<number, number> }>;

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
    const { index } = await this.ready();
    return index.ratings;
  }

  /** Builds the index if it is not built; a failed build is tried again at the next call. */
  async ready(): Promise<{ index: CatalogueIndex; positions: ReadonlyMap<number, number> }> {
    this.building ??= this.build();
    try {
      return await this.building;
    } catch (error) {
      this.building = undefined;
      throw error;
    }
  }

  /** Reads the whole catalogue again: after parts, ratings or company part numbers have come or gone, and each day. */
  @Cron(CronExpression.EVERY_DAY_AT_1AM)
  async rebuild(): Promise<void> {
    const next = this.build();
    await next;
    this.building = next;
  }

  /** Reads the standing of parts again after a change was committed, so that the next search shows it. */
  async refreshStanding(partIds: readonly number[]): Promise<void> {
    if (this.building === undefined) return;
    const { index, positions } = await this.ready();
    const rows = await this.readers.select<StandingRow>(standingSql, { ids: JSON.stringify(partIds) });
    for (const row of rows) {
      const position = positions.get(row.id);
      if (position !== undefined) fillStanding(index.columns, position, row);
    }
  }

  async onApplicationShutdown(): Promise<void> {
    await this.host.close();
  }

  private async build(): Promise<{ index: CatalogueIndex; positions: ReadonlyMap<number, number> }> {
    const index = await buildIndex(this.readers, await this.sizeRatings.all());
    const positions = new Map<number, number>();
    index.columns.partId.forEach((id, position) => positions.set(id, position));
    this.host.take(index);
    return { index, positions };
  }
}
