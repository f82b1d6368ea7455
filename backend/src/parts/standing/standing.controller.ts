import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import { ProblemDocument } from '../../common/problems/problem-document';
import { IdentifierPipe } from '../../common/validation/identifier.pipe';
import { CurrentPerson } from '../../permissions/current-person.decorator';
import { May } from '../../permissions/may.decorator';
import { Person } from '../../permissions/person';
import { PartDetails } from '../details/part-details';
import { PartDetailsDto } from '../details/part-details.dto';
import { ApprovalChanges } from './approval-changes';
import { approvalActions } from './approval-transitions';
import { ApprovalChangeForm, SupplyChangeForm } from './standing-forms.dto';
import { StandingTransitions } from './standing-transitions';
import { SupplyChanges } from './supply-changes';
import { TransitionsDto } from './transitions.dto';

@ApiTags('parts')
@Controller('parts')
export class StandingController {
  constructor(
    private readonly transitions: StandingTransitions,
    private readonly approvals: ApprovalChanges,
    private readonly supplies: SupplyChanges,
    private readonly details: PartDetails,
  ) {}

  @Get(':id/transitions')
  @May('read', 'Part')
  @ApiOperation({
    operationId: 'readTransitions',
    summary: 'What can become of a part, whether the person who asks may do it, and what it demands',
  })
  @ApiOkResponse({ type: TransitionsDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(
    @Param('id', IdentifierPipe) id: number,
    @CurrentPerson() person: Person,
  ): Promise<TransitionsDto> {
    return this.transitions.of(person, id);
  }

  @Post(':id/approval')
  @May(Object.values(approvalActions), 'Part')
  @HttpCode(200)
  @ApiOperation({
    operationId: 'changeApproval',
    summary: 'Submit, approve, promote, restrict or withdraw a part',
  })
  @ApiOkResponse({ type: PartDetailsDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiConflictResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async changeApproval(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: ApprovalChangeForm,
    @CurrentPerson() person: Person,
  ): Promise<PartDetailsDto> {
    await this.approvals.change(person, id, body);
    return this.details.find(id);
  }

  @Post(':id/supply')
  @May('set-supply-status', 'Part')
  @HttpCode(200)
  @ApiOperation({
    operationId: 'changeSupply',
    summary: 'Set the supply status of a part and its last order date',
  })
  @ApiOkResponse({ type: PartDetailsDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiConflictResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async changeSupply(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: SupplyChangeForm,
    @CurrentPerson() person: Person,
  ): Promise<PartDetailsDto> {
    await this.supplies.change(person, id, body);
    return this.details.find(id);
  }
}
