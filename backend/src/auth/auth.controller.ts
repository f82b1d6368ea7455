import { Body, Controller, Get, HttpCode, Post, Req, Res, UseGuards } from '@nestjs/common';
import {
  ApiForbiddenResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiTooManyRequestsResponse,
  ApiUnauthorizedResponse,
} from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { ProblemDocument } from '../common/problems/problem-document';
import { UnauthenticatedProblem } from '../common/problems/problems';
import { Environment } from '../config/environment';
import { CurrentPerson } from '../permissions/current-person.decorator';
import { May } from '../permissions/may.decorator';
import { Person } from '../permissions/person';
import { Public } from '../permissions/public.decorator';
import { AccessTokens } from './access-tokens';
import { deviceOf } from './device';
import { SignIn } from './dto/sign-in.dto';
import { Me, SignedIn } from './dto/signed-in.dto';
import { People } from './people';
import { presentMe, presentSignedIn } from './present-signed-in';
import { clearRefreshCookie, refreshTokenOf, setRefreshCookie } from './refresh-cookie';
import { SameOriginGuard } from './same-origin.guard';
import type { OpenSession } from './sessions';
import { SignInService } from './sign-in.service';

@ApiTags('auth')
@Controller('auth')
@UseGuards(SameOriginGuard)
export class AuthController {
  constructor(
    private readonly signIns: SignInService,
    private readonly people: People,
    private readonly accessTokens: AccessTokens,
    private readonly environment: Environment,
  ) {}

  @Post('sign-in')
  @Public()
  @HttpCode(200)
  @ApiOperation({ operationId: 'signIn', summary: 'Sign in; the refresh token comes as a cookie' })
  @ApiOkResponse({ type: SignedIn })
  @ApiUnauthorizedResponse({ type: ProblemDocument })
  @ApiTooManyRequestsResponse({ type: ProblemDocument })
  async signIn(
    @Body() body: SignIn,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SignedIn> {
    return this.answer(response, await this.signIns.signIn(body.email, body.password, deviceOf(request)));
  }

  @Post('refresh')
  @Public()
  @HttpCode(200)
  @ApiOperation({ operationId: 'refreshSignIn', summary: 'A new access token for the refresh cookie' })
  @ApiOkResponse({ type: SignedIn })
  @ApiUnauthorizedResponse({ type: ProblemDocument })
  @ApiForbiddenResponse({ type: ProblemDocument })
  async refresh(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<SignedIn> {
    return this.answer(response, await this.signIns.refresh(refreshTokenOf(request)));
  }

  @Post('sign-out')
  @Public()
  @HttpCode(204)
  @ApiOperation({ operationId: 'signOut', summary: 'End the sign-in of the refresh cookie' })
  @ApiNoContentResponse()
  @ApiForbiddenResponse({ type: ProblemDocument })
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    await this.signIns.signOut(refreshTokenOf(request));
    clearRefreshCookie(response, this.environment);
  }

  @Post('sign-out-everywhere')
  @May('manage', 'Account')
  @HttpCode(204)
  @ApiOperation({ operationId: 'signOutEverywhere', summary: 'End every sign-in of the person who asks' })
  @ApiNoContentResponse()
  async signOutEverywhere(
    @CurrentPerson() person: Person,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.signIns.signOutEverywhere(person.id);
    clearRefreshCookie(response, this.environment);
  }

  @Get('me')
  @May('manage', 'Account')
  @ApiOperation({ operationId: 'readMe', summary: 'Who is signed in and what he or she may do' })
  @ApiOkResponse({ type: Me })
  me(@CurrentPerson() person: Person): Me {
    return presentMe(person);
  }

  private async answer(response: Response, session: OpenSession): Promise<SignedIn> {
    const person = await this.people.ofSession(session.id);
    if (!person) throw new UnauthenticatedProblem();
    setRefreshCookie(response, this.environment, session.refreshToken);
    return presentSignedIn(person, await this.accessTokens.issue(session));
  }
}
