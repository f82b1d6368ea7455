import { Injectable } from '@nestjs/common';
import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import { Readers } from '../../database/readers';
import type { ApprovalStepDto, OpenReviewDto, ReviewCause, SupplyStepDto } from './standing.dto';

interface StepRow {
  reason: string;
  changed_by: number;
  changed_by_name: string;
  changed_at: string;
}

interface ApprovalStepRow extends StepRow {
  from_approval: Approval | null;
  to_approval: Approval;
  words: string | null;
  scope: string | null;
  exception: string | null;
}

interface SupplyStepRow extends StepRow {
  from_supply: SupplyStatus | null;
  to_supply: SupplyStatus;
  last_order_on: string | null;
}

interface ReviewRow {
  id: number;
  cause: ReviewCause;
  words: string;
  opened_by: number;
  opened_by_name: string;
  opened_at: string;
}

/** Reading how a part came to stand as it does. */
@Injectable()
export class PartStandingReading {
  constructor(private readonly readers: Readers) {}

  /** The newest first. */
  async approvalHistory(partId: number): Promise<ApprovalStepDto[]> {
    const rows = await this.readers.select<ApprovalStepRow>(
      `SELECT h.*, u.name AS changed_by_name FROM approval_history AS h JOIN users AS u ON u.id = h.changed_by
        WHERE h.part_id = $partId ORDER BY h.id DESC`,
      { partId },
    );
    return rows.map((row) => ({
      from: row.from_approval ?? undefined,
      to: row.to_approval,
      words: row.words ?? undefined,
      scope: row.scope ?? undefined,
      exception: row.exception ?? undefined,
      ...presentStep(row),
    }));
  }

  /** The newest first. */
  async supplyHistory(partId: number): Promise<SupplyStepDto[]> {
    const rows = await this.readers.select<SupplyStepRow>(
      `SELECT h.*, u.name AS changed_by_name FROM supply_history AS h JOIN users AS u ON u.id = h.changed_by
        WHERE h.part_id = $partId ORDER BY h.id DESC`,
      { partId },
    );
    return rows.map((row) => ({
      from: row.from_supply ?? undefined,
      to: row.to_supply,
      lastOrderOn: row.last_order_on ?? undefined,
      ...presentStep(row),
    }));
  }

  /** The oldest first. */
  async openReviews(partId: number): Promise<OpenReviewDto[]> {
    const rows = await this.readers.select<ReviewRow>(
      `SELECT r.id, r.cause, r.words, r.opened_by, u.name AS opened_by_name, r.opened_at
        FROM reviews AS r JOIN users AS u ON u.id = r.opened_by
        WHERE r.part_id = $partId AND r.state = 'open' ORDER BY r.id`,
      { partId },
    );
    return rows.map((row) => ({
      id: row.id,
      cause: row.cause,
      words: row.words,
      openedBy: { id: row.opened_by, name: row.opened_by_name },
      openedAt: row.opened_at,
    }));
  }
}

function presentStep(row: StepRow): Pick<ApprovalStepDto, 'reason' | 'changedBy' | 'changedAt'> {
  return {
    reason: row.reason,
    changedBy: { id: row.changed_by, name: row.changed_by_name },
    changedAt: row.changed_at,
  };
}
