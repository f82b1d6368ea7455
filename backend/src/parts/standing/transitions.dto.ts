import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  approvals,
  supplyStatuses,
  type Approval,
  type SupplyStatus,
} from '@resistry/engineering/ratings/technology';
import { ACTIONS, type Action } from '../../permissions/actions-and-subjects';
import { demandNames, type Demand, type DemandName } from './demands';

const fields = ['to', 'words', 'scope', 'exception', 'lastOrderDate'] as const;

export class DemandDto {
  @ApiProperty({ enum: demandNames })
  name: DemandName;

  @ApiProperty()
  met: boolean;

  @ApiProperty({ description: 'How it is, in a sentence' })
  words: string;

  @ApiProperty({
    enum: fields,
    description: 'Field of the change that fulfils it; `to` where only the part itself can',
  })
  field: Demand['field'];
}

export class ForbiddenByDto {
  @ApiProperty({ description: 'Name of the rule, as in a refusal' })
  rule: string;

  @ApiProperty()
  words: string;
}

class TransitionDto {
  @ApiProperty({ enum: ACTIONS, description: 'What it is called in the table of rules' })
  action: Action;

  @ApiProperty({ description: 'The rules let the person who asks do this to this part' })
  allowed: boolean;

  @ApiPropertyOptional({ type: ForbiddenByDto })
  forbiddenBy?: ForbiddenByDto;

  @ApiProperty({ type: [DemandDto], description: 'As things stand, with nothing filled in' })
  demands: DemandDto[];
}

export class ApprovalTransitionDto extends TransitionDto {
  @ApiProperty({ enum: approvals })
  to: Approval;
}

export class SupplyTransitionDto extends TransitionDto {
  @ApiProperty({ enum: supplyStatuses })
  to: SupplyStatus;
}

/** What can become of a part from where it stands. */
export class TransitionsDto {
  @ApiProperty({ description: 'Send it with a change' })
  version: number;

  @ApiProperty({ enum: approvals })
  approval: Approval;

  @ApiProperty({ enum: supplyStatuses })
  supply: SupplyStatus;

  @ApiProperty({ type: [ApprovalTransitionDto] })
  approvalTransitions: ApprovalTransitionDto[];

  @ApiProperty({ type: [SupplyTransitionDto] })
  supplyTransitions: SupplyTransitionDto[];
}
