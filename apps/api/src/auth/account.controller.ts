import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Req } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { IdParamDto } from '../common/id-param.dto';
import { ApiProblems } from '../common/problem.dto';
import { AccountService } from './account.service';
import { AccountDto, toAccountDto } from './dto/account.dto';
import { ChangePasswordDto } from './dto/change-password.dto';
import { SessionDto, toSessionDto } from './dto/session.dto';
import { UpdateAccountDto } from './dto/update-account.dto';
import { RequiresPermission } from './requires-permission.decorator';
import { SessionsService } from './sessions.service';
import { CurrentUser, type SignedIn } from './signed-in';

/** The account of the person who asks. */
@ApiTags('account')
@Controller('auth/account')
export class AccountController {
  constructor(
    private readonly account: AccountService,
    private readonly sessions: SessionsService,
  ) {}

  @Get()
  @RequiresPermission('account.use')
  @ApiOperation({ summary: 'Who is signed in, and what the role permits' })
  @ApiOkResponse({ type: AccountDto })
  read(@CurrentUser() { person }: SignedIn): AccountDto {
    return toAccountDto(person);
  }

  @Patch()
  @RequiresPermission('account.use')
  @ApiOperation({ summary: 'Change the own name or preferences' })
  @ApiOkResponse({ type: AccountDto })
  @ApiProblems('validation')
  async update(@CurrentUser() user: SignedIn, @Body() body: UpdateAccountDto): Promise<AccountDto> {
    return toAccountDto(await this.account.update(user, body));
  }

  @Post('password')
  @RequiresPermission('account.use')
  @HttpCode(204)
  @ApiOperation({ summary: 'Change the own password; signs all other devices out' })
  @ApiNoContentResponse()
  @ApiProblems('validation')
  changePassword(
    @CurrentUser() user: SignedIn,
    @Body() body: ChangePasswordDto,
    @Req() request: Request,
  ): Promise<void> {
    return this.account.changePassword(user, body, request.ip ?? '');
  }

  @Get('sessions')
  @RequiresPermission('account.use')
  @ApiOperation({ summary: 'The devices on which the person is signed in' })
  @ApiOkResponse({ type: [SessionDto] })
  async listSessions(@CurrentUser() { person, session }: SignedIn): Promise<SessionDto[]> {
    const sessions = await this.sessions.listLive(person.id);
    return sessions.map((each) => toSessionDto(each, session.id));
  }

  @Delete('sessions/:id')
  @RequiresPermission('account.use')
  @HttpCode(204)
  @ApiOperation({ summary: 'Sign one of the own devices out' })
  @ApiNoContentResponse()
  @ApiProblems('validation', 'notFound')
  endSession(@CurrentUser() { person }: SignedIn, @Param() { id }: IdParamDto): Promise<void> {
    return this.sessions.end(person.id, id);
  }
}
