import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Clock } from '../../common/clock';
import { NotFoundProblem, StaleEditProblem } from '../../common/problems/problems';
import { Writer } from '../../database/writer';
import { rebuildDerivedColumns } from '../derived-columns';
import { StandingChanges } from '../standing-changes';
import { partAndSourcesSql, type PartStanding, partStandingSql } from './part-standing';

/**
 * What every change of a part's standing has in common: one transaction, made on the version that the person saw, after
 * which the derived columns follow and whoever keeps a copy is told.
 */
@Injectable()
export class StandingDoor {
  constructor(
    private readonly writer: Writer,
    private readonly clock: Clock,
    private readonly changes: StandingChanges,
  ) {}

  /**
   * @param allow throws where the person may not do this to the part; asked before anything is told of it
   * @param apply makes the change; the version is taken care of
   * @throws NotFoundProblem
   * @throws StaleEditProblem where the part is no longer at that version
   */
  async pass(
    partId: number,
    version: number,
    allow: (part: PartStanding) => void,
    apply: (transaction: Transaction, part: PartStanding) => Promise<void>,
  ): Promise<void> {
    const affected = await this.writer.transaction(async (transaction) => {
      const today = this.clock.today();
      const [part] = await this.writer.select<PartStanding>(transaction, partStandingSql, { partId, today });
      if (!part) throw new NotFoundProblem(`There is no part ${partId}.`);
      allow(part);
      if (part.version !== version) throw new StaleEditProblem(`Part ${part.manufacturer_part_number}`);
      await apply(transaction, part);
      await this.writer.run(transaction, 'UPDATE parts SET version = version + 1 WHERE id = $partId', {
        partId,
      });
      await rebuildDerivedColumns(this.writer, transaction, [partId], today);
      return this.writer.select<{ id: number }>(transaction, partAndSourcesSql, { partId });
    });
    await this.changes.announce(affected.map(({ id }) => id));
  }
}
