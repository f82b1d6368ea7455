import { Injectable } from '@nestjs/common';
import type { SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { Transaction } from 'sequelize';
import { AuditTrail } from '../../audit/audit-trail';
import { Clock } from '../../common/clock';
import type { FieldError } from '../../common/problems/problem';
import { ClashProblem } from '../../common/problems/problems';
import { Writer } from '../../database/writer';
import type { Person } from '../../permissions/person';
import { approvalsInUse } from './approval-transitions';
import { supplyDemands, unmet } from './demands';
import { PartReviews } from './part-reviews';
import type { PartStanding } from './part-standing';
import { StandingDoor } from './standing-door';
import { StandingLetters } from './standing-letters';
import { approvalWords, supplyWords } from './standing-words';
import { supplyTransitions } from './supply-transitions';

export interface SupplyChange {
  to: SupplyStatus;
  reason: string;
  version: number;
  /** Day, ISO 8601 */
  lastOrderDate?: string;
}

/** The one door through which a part's supply status changes. */
@Injectable()
export class SupplyChanges {
  constructor(
    private readonly door: StandingDoor,
    private readonly writer: Writer,
    private readonly reviews: PartReviews,
    private readonly letters: StandingLetters,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  /**
   * @throws ForbiddenProblem where the person may not do this
   * @throws ClashProblem naming every demand that is not met, or saying that it cannot follow on what the part is
   */
  async change(actor: Person, partId: number, change: SupplyChange): Promise<void> {
    await this.door.pass({
      actor,
      partId,
      version: change.version,
      reason: change.reason,
      allow: (part) => {
        actor.demand('set-supply-status', 'Part', { enteredBy: part.entered_by });
        if (change.lastOrderDate !== undefined) {
          actor.demand('set-last-order-date', 'Part', { enteredBy: part.entered_by });
        }
      },
      apply: async (transaction, part) => {
        const today = this.clock.today();
        refuse(part, change, today);
        const lastOrderOn = lastOrderAfter(part, change, today);
        await this.write(transaction, actor, part, change, lastOrderOn);
        await this.audit.record(transaction, {
          actor,
          action: 'set-supply-status',
          subjectType: 'Part',
          subjectId: partId,
          before: {
            supply: part.supply,
            ...(part.last_order_on !== null && { lastOrderOn: part.last_order_on }),
          },
          after: { supply: change.to, ...(lastOrderOn !== null && { lastOrderOn }) },
          reason: change.reason,
        });
        await this.follow(transaction, actor, part, change);
        return `is now ${supplyWords[change.to]} in supply`;
      },
    });
  }

  private async write(
    transaction: Transaction,
    actor: Person,
    part: PartStanding,
    change: SupplyChange,
    lastOrderOn: string | null,
  ): Promise<void> {
    await this.writer.run(
      transaction,
      'UPDATE parts SET supply = $supply, last_order_on = $lastOrderOn WHERE id = $partId',
      { partId: part.id, supply: change.to, lastOrderOn },
    );
    await this.writer.insert(
      transaction,
      `INSERT INTO supply_history (part_id, from_supply, to_supply, last_order_on, reason, changed_by, changed_at)
        VALUES ($partId, $before, $after, $lastOrderOn, $reason, $changedBy, $changedAt)`,
      {
        partId: part.id,
        before: part.supply,
        after: change.to,
        lastOrderOn,
        reason: change.reason,
        changedBy: actor.id,
        changedAt: this.clock.timestamp(),
      },
    );
  }

  /** A part in use that leaves active supply is reviewed; the component engineers learn of every change of such a part. */
  private async follow(
    transaction: Transaction,
    actor: Person,
    part: PartStanding,
    { to, reason }: SupplyChange,
  ): Promise<void> {
    if (!approvalsInUse.includes(part.approval)) return;
    const words = `Its supply was ${supplyWords[part.supply]} and is now ${supplyWords[to]}: ${reason}`;
    const opened =
      part.supply === 'active' &&
      (await this.reviews.open(transaction, part.id, { cause: 'left-active-supply', words, actor }));
    await this.letters.toComponentEngineers(transaction, {
      part,
      actor,
      reason,
      event: `is now ${supplyWords[to]} in supply; it was ${supplyWords[part.supply]}`,
      request: opened ? `The part is ${approvalWords[part.approval]}: a review of it is open.` : undefined,
    });
  }
}

function refuse(part: PartStanding, change: SupplyChange, today: string): void {
  const name = part.manufacturer_part_number;
  const reachable = supplyTransitions[part.supply];
  if (!reachable.includes(change.to)) {
    const ends = reachable.map((supply) => supplyWords[supply]).join(', ');
    const message = `A supply that is ${supplyWords[part.supply]} can only become ${ends}.`;
    throw new ClashProblem(`${name} cannot become ${supplyWords[change.to]}. ${message}`, [
      { pointer: '/to', message },
    ]);
  }
  const errors = [
    ...misplaced(change, today),
    ...unmet(supplyDemands(change.to, change.lastOrderDate, today)),
  ];
  if (errors.length > 0) {
    const words = errors.map(({ message }) => message).join(' ');
    throw new ClashProblem(`${name} cannot become ${supplyWords[change.to]}: ${words}`, errors);
  }
}

function misplaced({ to, lastOrderDate }: SupplyChange, today: string): FieldError[] {
  if (lastOrderDate === undefined || to === 'last-time-buy') return [];
  const pointer = '/lastOrderDate';
  if (to !== 'discontinued') {
    return [{ pointer, message: 'Only a last-time buy or a discontinued part has a last order date.' }];
  }
  if (lastOrderDate <= today) return [];
  return [{ pointer, message: 'What can still be ordered is not discontinued: make it a last-time buy.' }];
}

/** A discontinued part keeps the last order date that it had, unless the vendor stopped before it. */
function lastOrderAfter(
  part: PartStanding,
  { to, lastOrderDate }: SupplyChange,
  today: string,
): string | null {
  if (lastOrderDate !== undefined) return lastOrderDate;
  const known = part.last_order_on;
  return to === 'discontinued' && known !== null && known <= today ? known : null;
}
