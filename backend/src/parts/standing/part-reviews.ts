import { Injectable } from '@nestjs/common';
import type { Approval } from '@resistry/engineering/ratings/technology';
import type { Transaction } from 'sequelize';
import { Clock } from '../../common/clock';
import { Writer } from '../../database/writer';
import type { Person } from '../../permissions/person';
import type { ReviewCause } from '../details/standing.dto';

/** Opening and closing the reviews of a part, in the transaction of what causes it. */
@Injectable()
export class PartReviews {
  constructor(
    private readonly writer: Writer,
    private readonly clock: Clock,
  ) {}

  /** Opens a review, unless one of the same cause is open already. @returns whether it did */
  async open(
    transaction: Transaction,
    partId: number,
    review: { cause: ReviewCause; words: string; actor: Person },
  ): Promise<boolean> {
    const opened = await this.writer.run(
      transaction,
      `INSERT INTO reviews (part_id, cause, words, opened_by, opened_at)
        SELECT $partId, $cause, $words, $openedBy, $openedAt WHERE NOT EXISTS
          (SELECT 1 FROM reviews WHERE part_id = $partId AND cause = $cause AND state = 'open')`,
      {
        partId,
        cause: review.cause,
        words: review.words,
        openedBy: review.actor.id,
        openedAt: this.clock.timestamp(),
      },
    );
    return opened === 1;
  }

  /** A decision on the part's approval closes what is open. @returns the ids of the closed reviews */
  async closeAll(
    transaction: Transaction,
    partId: number,
    outcome: Approval,
    actor: Person,
  ): Promise<number[]> {
    const rows = await this.writer.select<{ id: number }>(
      transaction,
      `UPDATE reviews SET state = 'closed', closed_by = $closedBy, closed_at = $closedAt, outcome = $outcome
        WHERE part_id = $partId AND state = 'open' RETURNING id`,
      { partId, outcome, closedBy: actor.id, closedAt: this.clock.timestamp() },
    );
    return rows.map(({ id }) => id);
  }
}
