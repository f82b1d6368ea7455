import { Body, Controller, Delete, Get, HttpCode, Param, Post, Put, Req } from '@nestjs/common';
import {
  ApiNoContentResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiTooManyRequestsResponse,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import type { Request } from 'express';
import { deviceOf } from '../auth/device';
import { ProblemDocument } from '../common/problems/problem-document';
import { UuidPipe } from '../common/validation/uuid.pipe';
import { CurrentPerson } from '../permissions/current-person.decorator';
import { May } from '../permissions/may.decorator';
import { Person } from '../permissions/person';
import { AccountService } from './account.service';
import { OwnName, OwnPassword, OwnSessions } from './dto/account.dto';

@ApiTags('account')
@Controller('account')
export class AccountController {
  constructor(private readonly account: AccountService) {}

  @Put('name')
  @May('manage', 'Account')
  @HttpCode(204)
  @ApiOperation({ operationId: 'changeOwnName', summary: 'Change the name that others see' })
  @ApiNoContentResponse()
  async rename(@Body() body: OwnName, @CurrentPerson() person: Person): Promise<void> {
    await this.account.rename(person, body.name);
  }

  @Post('password')
  @May('manage', 'Account')
  @HttpCode(204)
  @ApiOperation({ operationId: 'changeOwnPassword', summary: 'Change the password; other sessions end' })
  @ApiNoContentResponse()
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  @ApiTooManyRequestsResponse({ type: ProblemDocument })
  async changePassword(
    @Body() body: OwnPassword,
    @Req() request: Request,
    @CurrentPerson() person: Person,
  ): Promise<void> {
    await this.account.changePassword(
      person,
      deviceOf(request).address,
      body.currentPassword,
      body.newPassword,
    );
  }

  @Get('sessions')
  @May('manage', 'Account')
  @ApiOperation({ operationId: 'listOwnSessions', summary: 'Where the person is signed in' })
  @ApiOkResponse({ type: OwnSessions })
  async sessions(@CurrentPerson() person: Person): Promise<OwnSessions> {
    return { items: await this.account.listSessions(person) };
  }

  @Delete('sessions/:id')
  @May('manage', 'Account')
  @HttpCode(204)
  @ApiOperation({ operationId: 'endOwnSession', summary: 'Sign out one of the own sessions' })
  @ApiNoContentResponse()
  @ApiNotFoundResponse({ type: ProblemDocument })
  async endSession(@Param('id', UuidPipe) id: string, @CurrentPerson() person: Person): Promise<void> {
    await this.account.endSession(person, id);
  }
}
