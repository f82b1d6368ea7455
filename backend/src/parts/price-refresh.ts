import { Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { Cron } from '@nestjs/schedule';
import { PinoLogger } from 'nestjs-pino';
import { Clock } from '../common/clock';
import { Writer } from '../database/writer';
import { PRICE } from './derived-columns';
import { StandingChanges } from './standing-changes';

/** Keeps the stored prices to the day: offers come into force and run out without anybody doing anything. */
@Injectable()
export class PriceRefresh implements OnApplicationBootstrap {
  constructor(
    private readonly writer: Writer,
    private readonly clock: Clock,
    private readonly changes: StandingChanges,
    private readonly logger: PinoLogger,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    await this.refresh();
  }

  /** Offers are valid by days in UTC. */
  @Cron('10 0 0 * * *', { name: 'price-refresh', timeZone: 'UTC' })
  async nightly(): Promise<void> {
    try {
      await this.refresh();
    } catch (error) {
      this.logger.error({ err: error }, 'the nightly refresh of prices failed');
    }
  }

  /** @returns the ids of the parts whose price is another one today */
  async refresh(): Promise<number[]> {
    const changed = await this.writer.transaction((transaction) =>
      this.writer.select<{ id: number }>(
        transaction,
        `UPDATE parts SET derived_unit_price_micro = ${PRICE}
          WHERE (derived_unit_price_micro IS NOT NULL OR id IN (SELECT part_id FROM offers))
            AND derived_unit_price_micro IS NOT ${PRICE} RETURNING id`,
        { today: this.clock.today() },
      ),
    );
    const ids = changed.map(({ id }) => id);
    await this.changes.announce(ids);
    return ids;
  }
}
