import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Writer } from '../../database/writer';
import type { Person } from '../../permissions/person';
import { PartReviews } from './part-reviews';
import { nameOf, partAndSourcesSql, type PartStanding, partStandingSql } from './part-standing';
import { StandingLetters } from './standing-letters';

/** What was done to a part. */
export interface StandingDeed {
  actor: Person;
  part: PartStanding;
  /** What has become of it, continuing its name: `is now withdrawn` */
  event: string;
  reason: string;
}

/** Opens a review of each preferred part that a change of one of its sources leaves without a second source. */
@Injectable()
export class SecondSourceWatch {
  constructor(
    private readonly writer: Writer,
    private readonly reviews: PartReviews,
    private readonly letters: StandingLetters,
  ) {}

  /** The part and its sources that have a second source now. */
  async sourced(transaction: Transaction, partId: number): Promise<number[]> {
    const rows = await this.writer.select<{ id: number }>(
      transaction,
      `SELECT id FROM parts WHERE derived_second_source = 1 AND id IN (${partAndSourcesSql})`,
      { partId },
    );
    return rows.map(({ id }) => id);
  }

  /**
   * Call it when the derived columns have followed the change.
   *
   * @param sourced what had a second source before
   */
  async follow(
    transaction: Transaction,
    deed: StandingDeed,
    sourced: readonly number[],
    today: string,
  ): Promise<void> {
    const lost = await this.writer.select<{ id: number }>(
      transaction,
      `SELECT id FROM parts WHERE approval = 'preferred' AND derived_second_source = 0
        AND id IN (SELECT value FROM json_each($sourced)) ORDER BY id`,
      { sourced: JSON.stringify(sourced) },
    );
    for (const { id: partId } of lost) {
      const [part] = await this.writer.select<PartStanding>(transaction, partStandingSql, { partId, today });
      if (part) await this.review(transaction, part, deed);
    }
  }

  private async review(transaction: Transaction, lost: PartStanding, deed: StandingDeed): Promise<void> {
    const words = `Its second source ${deed.part.manufacturer_part_number} ${deed.event}: ${deed.reason}`;
    const review = { cause: 'lost-second-source', words, actor: deed.actor } as const;
    const opened = await this.reviews.open(transaction, lost.id, review);
    if (!opened) return;
    await this.letters.toComponentEngineers(transaction, {
      part: lost,
      actor: deed.actor,
      event: `has no second source any more: ${nameOf(deed.part)} ${deed.event}`,
      reason: deed.reason,
      request: 'The part is preferred: a review of it is open.',
    });
  }
}
