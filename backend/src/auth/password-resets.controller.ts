import { Body, Controller, HttpCode, Post, Req, UseGuards } from '@nestjs/common';
import {
  ApiAcceptedResponse,
  ApiNoContentResponse,
  ApiOperation,
  ApiTags,
  ApiTooManyRequestsResponse,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import type { Request } from 'express';
import { ProblemDocument } from '../common/problems/problem-document';
import { Public } from '../permissions/public.decorator';
import { deviceOf } from './device';
import { NewPassword, PasswordResetRequest, PasswordResetTaken } from './dto/password-reset.dto';
import { PasswordResets } from './password-resets';
import { SameOriginGuard } from './same-origin.guard';

@ApiTags('auth')
@Controller('auth/password-resets')
@UseGuards(SameOriginGuard)
export class PasswordResetsController {
  constructor(private readonly resets: PasswordResets) {}

  @Post()
  @Public()
  @HttpCode(202)
  @ApiOperation({
    operationId: 'requestPasswordReset',
    summary: 'Have a link to a new password sent by mail',
  })
  @ApiAcceptedResponse({ type: PasswordResetTaken })
  @ApiTooManyRequestsResponse({ type: ProblemDocument })
  async request(@Body() body: PasswordResetRequest, @Req() request: Request): Promise<PasswordResetTaken> {
    await this.resets.request(body.email, deviceOf(request).address);
    return {
      message: 'If the address has an account, a letter with a link is on its way. It is good for an hour.',
    };
  }

  @Post('redeem')
  @Public()
  @HttpCode(204)
  @ApiOperation({
    operationId: 'resetPassword',
    summary: 'Set a new password with the token from the letter',
  })
  @ApiNoContentResponse()
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async redeem(@Body() body: NewPassword): Promise<void> {
    await this.resets.redeem(body.token, body.password);
  }
}
