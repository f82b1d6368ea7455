import { Injectable } from '@nestjs/common';
import type { Approval } from '@resistry/engineering/ratings/technology';
import { rowsOfPage } from '../common/reading/page-query';
import { Readers } from '../database/readers';
import type { ReviewCause } from '../parts/details/standing.dto';
import { PartSummaries, presentPartSummary } from '../parts/summary/part-summaries';
import type { ReviewList, ReviewQuery } from './review.dto';

interface ReviewRow {
  id: number;
  part_id: number;
  cause: ReviewCause;
  words: string;
  state: 'open' | 'closed';
  opened_by: number;
  opened_by_name: string;
  opened_at: string;
  closed_by: number | null;
  closed_by_name: string | null;
  closed_at: string | null;
  outcome: Approval | null;
}

const REVIEWS = `
  SELECT r.id, r.part_id, r.cause, r.words, r.state, r.opened_by, o.name AS opened_by_name, r.opened_at, r.closed_by,
    c.name AS closed_by_name, r.closed_at, r.outcome
  FROM reviews AS r JOIN users AS o ON o.id = r.opened_by LEFT JOIN users AS c ON c.id = r.closed_by
  WHERE r.state = $state`;

/** Reading the reviews of parts. */
@Injectable()
export class ReviewsService {
  constructor(
    private readonly readers: Readers,
    private readonly parts: PartSummaries,
  ) {}

  async list(query: ReviewQuery): Promise<ReviewList> {
    const state = query.state ?? 'open';
    const [counted] = await this.readers.select<{ total: number }>(
      'SELECT count(*) AS total FROM reviews WHERE state = $state',
      { state },
    );
    const order = state === 'open' ? 'r.opened_at, r.id' : 'r.closed_at DESC, r.id DESC';
    const rows = await this.readers.select<ReviewRow>(
      `${REVIEWS} ORDER BY ${order} LIMIT $limit OFFSET $offset`,
      { state, ...rowsOfPage(query) },
    );
    const parts = await this.parts.rows(rows.map(({ part_id: partId }) => partId));
    return {
      total: counted?.total ?? 0,
      items: rows.flatMap((row) => {
        const part = parts.get(row.part_id);
        if (!part) return [];
        return [
          {
            id: row.id,
            part: presentPartSummary(part),
            cause: row.cause,
            words: row.words,
            state: row.state,
            openedBy: { id: row.opened_by, name: row.opened_by_name },
            openedAt: row.opened_at,
            closedBy:
              row.closed_by === null || row.closed_by_name === null
                ? undefined
                : { id: row.closed_by, name: row.closed_by_name },
            closedAt: row.closed_at ?? undefined,
            outcome: row.outcome ?? undefined,
          },
        ];
      }),
    };
  }
}
