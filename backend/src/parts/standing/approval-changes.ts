import { Injectable } from '@nestjs/common';
import type { Approval } from '@resistry/engineering/ratings/technology';
import type { Transaction } from 'sequelize';
import { AuditTrail } from '../../audit/audit-trail';
import { Clock } from '../../common/clock';
import type { FieldError } from '../../common/problems/problem';
import { ClashProblem } from '../../common/problems/problems';
import { Writer } from '../../database/writer';
import type { Person } from '../../permissions/person';
import { approvalActions, reachableApprovals } from './approval-transitions';
import { type ApprovalInput, approvalDemands, unmet } from './demands';
import { PartReviews } from './part-reviews';
import type { PartStanding } from './part-standing';
import { StandingDoor } from './standing-door';
import { StandingLetters } from './standing-letters';
import { approvalWords } from './standing-words';

export interface ApprovalChange extends ApprovalInput {
  to: Approval;
  reason: string;
  version: number;
}

/** The one door through which a part's approval changes. */
@Injectable()
export class ApprovalChanges {
  constructor(
    private readonly door: StandingDoor,
    private readonly writer: Writer,
    private readonly reviews: PartReviews,
    private readonly letters: StandingLetters,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  /**
   * @throws ForbiddenProblem where the person may not do this to this part
   * @throws ClashProblem naming every demand that is not met, or saying that it cannot follow on what the part is
   */
  async change(actor: Person, partId: number, change: ApprovalChange): Promise<void> {
    const action = approvalActions[change.to];
    await this.door.pass({
      actor,
      partId,
      version: change.version,
      reason: change.reason,
      allow: (part) => actor.demand(action, 'Part', { enteredBy: part.entered_by }),
      apply: async (transaction, part) => {
        refuse(part, change);
        await this.write(transaction, actor, part, change);
        await this.audit.record(transaction, {
          actor,
          action,
          subjectType: 'Part',
          subjectId: partId,
          before: before(part),
          after: after(change),
          reason: change.reason,
        });
        await this.follow(transaction, actor, part, change);
        return `is now ${approvalWords[change.to]}`;
      },
    });
  }

  private async write(
    transaction: Transaction,
    actor: Person,
    part: PartStanding,
    change: ApprovalChange,
  ): Promise<void> {
    const restriction = { words: change.words ?? null, scope: change.scope ?? null };
    await this.writer.run(
      transaction,
      `UPDATE parts SET approval = $approval, restriction_words = $words, restriction_scope = $scope WHERE id = $partId`,
      { partId: part.id, approval: change.to, ...restriction },
    );
    await this.writer.insert(
      transaction,
      `INSERT INTO approval_history
          (part_id, from_approval, to_approval, words, scope, exception, reason, changed_by, changed_at)
        VALUES ($partId, $before, $after, $words, $scope, $exception, $reason, $changedBy, $changedAt)`,
      {
        partId: part.id,
        before: part.approval,
        after: change.to,
        ...restriction,
        exception: change.exception ?? null,
        reason: change.reason,
        changedBy: actor.id,
        changedAt: this.clock.timestamp(),
      },
    );
  }

  /** A submission opens a review, a decision closes those that are open; both are told to whom they concern. */
  private async follow(
    transaction: Transaction,
    actor: Person,
    part: PartStanding,
    { to, reason }: ApprovalChange,
  ): Promise<void> {
    const was = approvalWords[part.approval];
    const event = to === part.approval ? `stays ${was}` : `is now ${approvalWords[to]}; it was ${was}`;
    const news = { part, actor, reason, event };
    if (to === 'in-review') {
      await this.reviews.open(transaction, part.id, { cause: 'submitted', words: reason, actor });
      await this.letters.toComponentEngineers(transaction, {
        ...news,
        request: 'It waits for your decision.',
      });
    } else {
      const closed = await this.reviews.closeAll(transaction, part.id, to, actor);
      await this.letters.toThoseWhoBroughtIt(transaction, news, closed);
    }
  }
}

function refuse(part: PartStanding, change: ApprovalChange): void {
  const name = part.manufacturer_part_number;
  const reachable = reachableApprovals(part);
  if (!reachable.includes(change.to)) {
    const ends = reachable.map((approval) => approvalWords[approval]).join(', ');
    const message = `A part that is ${approvalWords[part.approval]} can only become ${ends}.`;
    throw new ClashProblem(`${name} cannot become ${approvalWords[change.to]}. ${message}`, [
      { pointer: '/to', message },
    ]);
  }
  const errors = [...misplaced(change), ...unmet(approvalDemands(change.to, part, change))];
  if (errors.length > 0) {
    const words = errors.map(({ message }) => message).join(' ');
    throw new ClashProblem(`${name} cannot become ${approvalWords[change.to]}: ${words}`, errors);
  }
}

/** Fields that mean nothing for this change: taken in silently, they would look as if they held. */
function misplaced({ to, words, scope, exception }: ApprovalChange): FieldError[] {
  const restricted = 'Only a restriction has words and a scope.';
  return [
    ...(to !== 'restricted' && words !== undefined ? [{ pointer: '/words', message: restricted }] : []),
    ...(to !== 'restricted' && scope !== undefined ? [{ pointer: '/scope', message: restricted }] : []),
    ...(to !== 'preferred' && exception !== undefined
      ? [{ pointer: '/exception', message: 'Only a promotion has an exception.' }]
      : []),
  ];
}

function before({ approval, restriction_words: words, restriction_scope: scope }: PartStanding): object {
  return { approval, ...(words !== null && { words }), ...(scope !== null && { scope }) };
}

function after({ to, words, scope, exception }: ApprovalChange): object {
  return { approval: to, words, scope, exception };
}
