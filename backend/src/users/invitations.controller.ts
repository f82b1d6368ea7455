import { Body, Controller, Delete, Get, HttpCode, Param, Post } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { UuidPipe } from '../common/validation/uuid.pipe';
import { CurrentPerson } from '../permissions/current-person.decorator';
import { May } from '../permissions/may.decorator';
import { Person } from '../permissions/person';
import { Public } from '../permissions/public.decorator';
import {
  InvitationAcceptanceForm,
  InvitationCreated,
  InvitationList,
  InvitationPreview,
  InvitationToken,
  NewInvitation,
} from './dto/invitation.dto';
import { InvitationAcceptance } from './invitation-acceptance';
import { Invitations } from './invitations';

@ApiTags('invitations')
@Controller('invitations')
export class InvitationsController {
  constructor(
    private readonly invitations: Invitations,
    private readonly acceptance: InvitationAcceptance,
  ) {}

  @Get()
  @May('invite', 'User')
  @ApiOperation({ operationId: 'listInvitations', summary: 'Invitations that nobody has followed yet' })
  @ApiOkResponse({ type: InvitationList })
  async list(): Promise<InvitationList> {
    return { items: await this.invitations.listOpen() };
  }

  @Post()
  @May('invite', 'User')
  @ApiOperation({ operationId: 'invite', summary: 'Send somebody a way in by mail' })
  @ApiCreatedResponse({ type: InvitationCreated })
  @ApiConflictResponse({ type: ProblemDocument })
  async invite(@Body() body: NewInvitation, @CurrentPerson() person: Person): Promise<InvitationCreated> {
    return { id: await this.invitations.invite(person, body.email, body.roles) };
  }

  @Delete(':id')
  @May('invite', 'User')
  @HttpCode(204)
  @ApiOperation({ operationId: 'withdrawInvitation', summary: 'Take an invitation back' })
  @ApiNoContentResponse()
  @ApiNotFoundResponse({ type: ProblemDocument })
  async withdraw(@Param('id', UuidPipe) id: string, @CurrentPerson() person: Person): Promise<void> {
    await this.invitations.withdraw(person, id);
  }

  @Post('preview')
  @Public()
  @HttpCode(200)
  @ApiOperation({ operationId: 'previewInvitation', summary: 'What the invitation with this token offers' })
  @ApiOkResponse({ type: InvitationPreview })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async preview(@Body() body: InvitationToken): Promise<InvitationPreview> {
    return this.acceptance.preview(body.token);
  }

  @Post('accept')
  @Public()
  @HttpCode(204)
  @ApiOperation({ operationId: 'acceptInvitation', summary: 'Make the account; then sign in' })
  @ApiNoContentResponse()
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async accept(@Body() body: InvitationAcceptanceForm): Promise<void> {
    await this.acceptance.accept(body.token, body.name, body.password);
  }
}
