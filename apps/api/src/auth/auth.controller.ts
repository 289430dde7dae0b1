import { Body, Controller, HttpCode, Inject, Post, Req, Res, UseGuards } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { ApiProblems } from '../common/problem.dto';
import { ProblemException } from '../common/problem.exception';
import { SETTINGS, type Settings } from '../common/settings';
import type { Person } from '../people/person.entity';
import { AuthService } from './auth.service';
import { clearTokens, readToken, setTokens } from './cookies';
import { AccountDto, toAccountDto } from './dto/account.dto';
import { SignInDto } from './dto/sign-in.dto';
import { LocalAuthGuard } from './local-auth.guard';
import { Public } from './public.decorator';
import { SessionsService } from './sessions.service';
import { CurrentUser } from './signed-in';

/** Signing in and out; the tokens travel in cookies alone. */
@ApiTags('auth')
@Controller('auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly sessions: SessionsService,
    @Inject(SETTINGS) private readonly settings: Settings,
  ) {}

  @Post('sign-in')
  @Public()
  @UseGuards(LocalAuthGuard)
  @HttpCode(200)
  @ApiOperation({ summary: 'Sign in; sets the cookies of a new session' })
  @ApiOkResponse({ type: AccountDto })
  @ApiProblems('validation', 'signInFailed', 'accountClosed', 'crossSite', 'tooManyRequests')
  async signIn(
    @Body() body: SignInDto,
    @CurrentUser() person: Person,
    @Res({ passthrough: true }) response: Response,
  ): Promise<AccountDto> {
    setTokens(response, await this.auth.signIn(person, body.deviceName), this.settings.https);
    return toAccountDto(person);
  }

  @Post('refresh')
  @Public()
  @HttpCode(200)
  @ApiOperation({ summary: 'Replace the cookies of the session; once every 15 minutes' })
  @ApiOkResponse({ type: AccountDto })
  @ApiProblems('notSignedIn', 'sessionEnded', 'accountClosed', 'crossSite', 'tooManyRequests')
  async refresh(
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<AccountDto> {
    const token = readToken(request, 'refresh', this.settings.https);
    if (!token) throw new ProblemException('notSignedIn');
    const { person, ...tokens } = await this.sessions.refresh(token);
    setTokens(response, tokens, this.settings.https);
    return toAccountDto(person);
  }

  @Post('sign-out')
  @Public()
  @HttpCode(204)
  @ApiOperation({ summary: 'End the session of this device; harmless when there is none' })
  @ApiNoContentResponse()
  @ApiProblems('crossSite', 'tooManyRequests')
  async signOut(
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    const token = readToken(request, 'refresh', this.settings.https);
    if (token) await this.sessions.endByToken(token);
    clearTokens(response, this.settings.https);
  }
}
