import { Body, Controller, Get, HttpCode, Param, Post, Put } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { IdentifierPipe } from '../common/validation/identifier.pipe';
import { CurrentPerson } from '../permissions/current-person.decorator';
import { May } from '../permissions/may.decorator';
import { Person } from '../permissions/person';
import { NewRoles, ReasonedChange, UserDetails, UserList } from './dto/user.dto';
import { UserChanges } from './user-changes';
import { UserQueries } from './user-queries';

@ApiTags('users')
@Controller('users')
export class UsersController {
  constructor(
    private readonly queries: UserQueries,
    private readonly changes: UserChanges,
  ) {}

  @Get()
  @May('read', 'User')
  @ApiOperation({ operationId: 'listUsers', summary: 'Everybody who has an account' })
  @ApiOkResponse({ type: UserList })
  async list(): Promise<UserList> {
    return { items: await this.queries.list() };
  }

  @Get(':id')
  @May('read', 'User')
  @ApiOperation({ operationId: 'readUser', summary: 'One account' })
  @ApiOkResponse({ type: UserDetails })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(@Param('id', IdentifierPipe) id: number): Promise<UserDetails> {
    return this.queries.find(id);
  }

  @Put(':id/roles')
  @May('change-roles', 'User')
  @ApiOperation({ operationId: 'changeUserRoles', summary: 'Give a person these roles and no others' })
  @ApiOkResponse({ type: UserDetails })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiConflictResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async changeRoles(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: NewRoles,
    @CurrentPerson() person: Person,
  ): Promise<UserDetails> {
    await this.changes.changeRoles(person, id, body);
    return this.queries.find(id);
  }

  @Post(':id/deactivate')
  @May('deactivate', 'User')
  @HttpCode(200)
  @ApiOperation({ operationId: 'deactivateUser', summary: 'Keep a person out and end his or her sessions' })
  @ApiOkResponse({ type: UserDetails })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiConflictResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async deactivate(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: ReasonedChange,
    @CurrentPerson() person: Person,
  ): Promise<UserDetails> {
    await this.changes.deactivate(person, id, body.version, body.reason);
    return this.queries.find(id);
  }

  @Post(':id/reactivate')
  @May('reactivate', 'User')
  @HttpCode(200)
  @ApiOperation({ operationId: 'reactivateUser', summary: 'Let a person back in' })
  @ApiOkResponse({ type: UserDetails })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiConflictResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async reactivate(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: ReasonedChange,
    @CurrentPerson() person: Person,
  ): Promise<UserDetails> {
    await this.changes.reactivate(person, id, body.version, body.reason);
    return this.queries.find(id);
  }
}
