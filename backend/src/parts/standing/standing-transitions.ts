import { Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { NotFoundProblem } from '../../common/problems/problems';
import { Readers } from '../../database/readers';
import { mayDo } from '../../permissions/ability';
import type { Action } from '../../permissions/actions-and-subjects';
import type { Person } from '../../permissions/person';
import { refusalOf } from '../../permissions/refusal';
import { approvalActions, reachableApprovals } from './approval-transitions';
import { approvalDemands, supplyDemands } from './demands';
import { type PartStanding, partStandingSql } from './part-standing';
import { supplyTransitions } from './supply-transitions';
import type { ForbiddenByDto, TransitionsDto } from './transitions.dto';

/** Reading what can become of a part, who may do it and what it demands. */
@Injectable()
export class StandingTransitions {
  constructor(
    private readonly readers: Readers,
    private readonly clock: Clock,
  ) {}

  /** @throws NotFoundProblem */
  async of(person: Person, partId: number): Promise<TransitionsDto> {
    const today = this.clock.today();
    const part = await this.readers.lookUp<PartStanding>(partStandingSql, { partId, today });
    if (!part) throw new NotFoundProblem(`There is no part ${partId}.`);
    const permission = (action: Action): { allowed: boolean; forbiddenBy?: ForbiddenByDto } =>
      permissionOf(person, action, part);
    return {
      version: part.version,
      approval: part.approval,
      supply: part.supply,
      approvalTransitions: reachableApprovals(part).map((to) => ({
        to,
        action: approvalActions[to],
        ...permission(approvalActions[to]),
        demands: approvalDemands(to, part, {}),
      })),
      supplyTransitions: supplyTransitions[part.supply].map((to) => ({
        to,
        action: 'set-supply-status',
        ...permission('set-supply-status'),
        demands: supplyDemands(to, undefined, today),
      })),
    };
  }
}

function permissionOf(
  person: Person,
  action: Action,
  part: PartStanding,
): { allowed: boolean; forbiddenBy?: ForbiddenByDto } {
  if (mayDo(person.ability, action, 'Part', { enteredBy: part.entered_by })) return { allowed: true };
  const refusal = refusalOf(action, 'Part');
  return {
    allowed: false,
    forbiddenBy: { rule: refusal.members.rule ?? `${action} Part`, words: refusal.detail },
  };
}
