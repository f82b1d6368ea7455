import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { Clock } from '../../common/clock';
import { NotFoundProblem, StaleEditProblem } from '../../common/problems/problems';
import { Writer } from '../../database/writer';
import { rebuildDerivedColumns } from '../derived-columns';
import type { Person } from '../../permissions/person';
import { StandingChanges } from '../standing-changes';
import { partAndSourcesSql, type PartStanding, partStandingSql } from './part-standing';
import { SecondSourceWatch } from './second-source-watch';

/** A change of a part's standing, on its way through the door. */
export interface StandingPassage {
  actor: Person;
  partId: number;
  /** Of the part, as the person saw it. */
  version: number;
  reason: string;
  /** Throws where the person may not do this to the part; asked before anything is told of it. */
  allow: (part: PartStanding) => void;
  /** Makes the change; the version is taken care of. @returns what has become of the part: `is now withdrawn` */
  apply: (transaction: Transaction, part: PartStanding) => Promise<string>;
}

/**
 * What every change of a part's standing has in common: one transaction, made on the version that the person saw, after
 * which the derived columns follow, preferred parts that lost their second source are reviewed, and whoever keeps a copy is
 * told.
 */
@Injectable()
export class StandingDoor {
  constructor(
    private readonly writer: Writer,
    private readonly clock: Clock,
    private readonly secondSources: SecondSourceWatch,
    private readonly changes: StandingChanges,
  ) {}

  /**
   * @throws NotFoundProblem
   * @throws StaleEditProblem where the part is no longer at that version
   */
  async pass({ actor, partId, version, reason, allow, apply }: StandingPassage): Promise<void> {
    const affected = await this.writer.transaction(async (transaction) => {
      const today = this.clock.today();
      const [part] = await this.writer.select<PartStanding>(transaction, partStandingSql, { partId, today });
      if (!part) throw new NotFoundProblem(`There is no part ${partId}.`);
      allow(part);
      if (part.version !== version) throw new StaleEditProblem(`Part ${part.manufacturer_part_number}`);
      const sourced = await this.secondSources.sourced(transaction, partId);
      const event = await apply(transaction, part);
      await this.writer.run(transaction, 'UPDATE parts SET version = version + 1 WHERE id = $partId', {
        partId,
      });
      await rebuildDerivedColumns(this.writer, transaction, [partId], today);
      await this.secondSources.follow(transaction, { actor, part, event, reason }, sourced, today);
      return this.writer.select<{ id: number }>(transaction, partAndSourcesSql, { partId });
    });
    await this.changes.announce(affected.map(({ id }) => id));
  }
}
