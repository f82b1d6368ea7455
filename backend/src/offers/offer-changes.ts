import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditTrail } from '../audit/audit-trail';
import { Clock } from '../common/clock';
import { ClashProblem, NotFoundProblem, StaleEditProblem } from '../common/problems/problems';
import { Writer } from '../database/writer';
import { rebuildDerivedColumns } from '../parts/derived-columns';
import { StandingChanges } from '../parts/standing-changes';
import type { Person } from '../permissions/person';
import { type OfferRecord, offerRecordSql, type OfferRecordRow, recordOf } from './offer-record';
import { OfferRefusals } from './offer-refusals';
import { microOf, type OfferTerms } from './offer-terms';

export interface ReasonedTerms extends OfferTerms {
  reason: string;
}

/** The one door through which offers are entered, changed and ended; prices follow in the same transaction. */
@Injectable()
export class OfferChanges {
  constructor(
    private readonly writer: Writer,
    private readonly clock: Clock,
    private readonly refusals: OfferRefusals,
    private readonly audit: AuditTrail,
    private readonly changes: StandingChanges,
  ) {}

  /** @returns the id of the new offer. @throws ClashProblem naming every field that clashes */
  async enter(actor: Person, partId: number, terms: ReasonedTerms): Promise<number> {
    actor.demand('create', 'Offer', {});
    const id = await this.writer.transaction(async (transaction) => {
      await this.refusals.demand(transaction, partId, terms);
      const entered = await this.writer.insert(
        transaction,
        `INSERT INTO offers (part_id, supplier_id, packaging_code, minimum_order, order_multiple, lead_time_days, valid_from,
            valid_until, entered_by, entered_at)
          VALUES ($partId, $supplierId, $packaging, $minimumOrder, $orderMultiple, $leadTimeDays, $validFrom, $validUntil,
            $enteredBy, $enteredAt)`,
        { partId, ...columnsOf(terms), enteredBy: actor.id, enteredAt: this.clock.timestamp() },
      );
      await this.writePrices(transaction, entered, terms);
      const { record } = await this.read(transaction, entered);
      await this.settle(transaction, partId, { actor, action: 'create', id: entered, after: record, terms });
      return entered;
    });
    await this.changes.announce([partId]);
    return id;
  }

  /** @throws ClashProblem @throws StaleEditProblem @throws NotFoundProblem */
  async change(actor: Person, id: number, version: number, terms: ReasonedTerms): Promise<void> {
    actor.demand('update', 'Offer', {});
    const partId = await this.writer.transaction(async (transaction) => {
      const { row, record: before } = await this.current(transaction, id, version);
      await this.refusals.demand(transaction, row.part_id, terms);
      await this.writer.run(
        transaction,
        `UPDATE offers SET supplier_id = $supplierId, packaging_code = $packaging, minimum_order = $minimumOrder,
          order_multiple = $orderMultiple, lead_time_days = $leadTimeDays, valid_from = $validFrom,
          valid_until = $validUntil, version = version + 1 WHERE id = $id`,
        { id, ...columnsOf(terms) },
      );
      await this.writer.run(transaction, 'DELETE FROM offer_price_breaks WHERE offer_id = $id', { id });
      await this.writePrices(transaction, id, terms);
      const { record: after } = await this.read(transaction, id);
      await this.settle(transaction, row.part_id, { actor, action: 'update', id, before, after, terms });
      return row.part_id;
    });
    await this.changes.announce([partId]);
  }

  /** @throws ClashProblem @throws StaleEditProblem @throws NotFoundProblem */
  async end(actor: Person, id: number, version: number, reason: string): Promise<void> {
    actor.demand('end', 'Offer', {});
    const partId = await this.writer.transaction(async (transaction) => {
      const { row, record: before } = await this.current(transaction, id, version);
      await this.writer.run(
        transaction,
        'UPDATE offers SET ended_at = $endedAt, version = version + 1 WHERE id = $id',
        { id, endedAt: this.clock.timestamp() },
      );
      const { record: after } = await this.read(transaction, id);
      await this.settle(transaction, row.part_id, {
        actor,
        action: 'end',
        id,
        before,
        after,
        terms: { reason },
      });
      return row.part_id;
    });
    await this.changes.announce([partId]);
  }

  private async read(
    transaction: Transaction,
    id: number,
  ): Promise<{ row: OfferRecordRow; record: OfferRecord }> {
    const [row] = await this.writer.select<OfferRecordRow>(transaction, offerRecordSql, { id });
    if (!row) throw new NotFoundProblem(`There is no offer ${id}.`);
    return { row, record: recordOf(row) };
  }

  private async current(
    transaction: Transaction,
    id: number,
    version: number,
  ): Promise<{ row: OfferRecordRow; record: OfferRecord }> {
    const found = await this.read(transaction, id);
    if (found.row.version !== version) throw new StaleEditProblem(`The offer of ${found.row.supplier}`);
    if (found.row.ended_at !== null) {
      throw new ClashProblem(`The offer of ${found.row.supplier} has been ended: enter a new one instead.`);
    }
    return found;
  }

  private async writePrices(transaction: Transaction, offerId: number, terms: OfferTerms): Promise<void> {
    for (const { quantity, unitPrice } of terms.priceBreaks) {
      await this.writer.run(
        transaction,
        'INSERT INTO offer_price_breaks (offer_id, quantity, unit_price_micro) VALUES ($offerId, $quantity, $micro)',
        { offerId, quantity, micro: microOf(unitPrice) ?? null },
      );
    }
  }

  private async settle(
    transaction: Transaction,
    partId: number,
    deed: {
      actor: Person;
      action: 'create' | 'update' | 'end';
      id: number;
      before?: OfferRecord;
      after: OfferRecord;
      terms: { reason: string };
    },
  ): Promise<void> {
    const { actor, action, id, before, after, terms } = deed;
    await rebuildDerivedColumns(this.writer, transaction, [partId], this.clock.today());
    await this.audit.record(transaction, {
      actor,
      action,
      subjectType: 'Offer',
      subjectId: id,
      before,
      after,
      reason: terms.reason,
    });
  }
}

function columnsOf(terms: OfferTerms): Record<string, string | number> {
  const { supplierId, packaging, minimumOrder, orderMultiple, leadTimeDays, validFrom, validUntil } = terms;
  return { supplierId, packaging, minimumOrder, orderMultiple, leadTimeDays, validFrom, validUntil };
}
