import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import {
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import type { Page } from '@lampwright/contracts';
import { SessionDto, toSessionDto } from '../auth/dto/session.dto';
import { RequiresPermission } from '../auth/requires-permission.decorator';
import { SessionsService } from '../auth/sessions.service';
import { CurrentUser, type SignedIn } from '../auth/signed-in';
import { IdParamDto } from '../common/id-param.dto';
import { PageQueryDto } from '../common/page-query.dto';
import { pageOf } from '../common/page.dto';
import { ApiProblems } from '../common/problem.dto';
import { PersonDto, toPersonDto } from './dto/person.dto';
import { PersonSessionParamDto } from './dto/person-session-param.dto';
import { CreatePersonDto, UpdatePersonDto } from './dto/write-person.dto';
import { PeopleService } from './people.service';

/** The accounts of the yard, for leads. */
@ApiTags('people')
@Controller('people')
export class PeopleController {
  constructor(
    private readonly people: PeopleService,
    private readonly sessions: SessionsService,
  ) {}

  @Get()
  @RequiresPermission('people.read')
  @ApiOperation({ summary: 'List people; sort by name, email, role or lastSignInAt' })
  @ApiOkResponse({ type: pageOf(PersonDto, 'PersonPage') })
  @ApiProblems('validation')
  list(@Query() query: PageQueryDto): Promise<Page<PersonDto>> {
    return this.people.list(query);
  }

  @Post()
  @RequiresPermission('people.write')
  @ApiOperation({ summary: 'Open an account' })
  @ApiCreatedResponse({ type: PersonDto })
  @ApiProblems('validation', 'conflict')
  async create(@Body() body: CreatePersonDto): Promise<PersonDto> {
    return toPersonDto(await this.people.create(body));
  }

  @Patch(':id')
  @RequiresPermission('people.write')
  @ApiOperation({ summary: "Change a person's name or role" })
  @ApiOkResponse({ type: PersonDto })
  @ApiProblems('validation', 'notFound', 'lastLead')
  async update(@Param() { id }: IdParamDto, @Body() body: UpdatePersonDto): Promise<PersonDto> {
    return toPersonDto(await this.people.update(id, body));
  }

  @Post(':id/close')
  @RequiresPermission('people.write')
  @HttpCode(200)
  @ApiOperation({ summary: 'Close an account; ends its sessions at once' })
  @ApiOkResponse({ type: PersonDto })
  @ApiProblems('validation', 'notFound', 'lastLead')
  async close(@Param() { id }: IdParamDto): Promise<PersonDto> {
    return toPersonDto(await this.people.close(id));
  }

  @Post(':id/reopen')
  @RequiresPermission('people.write')
  @HttpCode(200)
  @ApiOperation({ summary: 'Open a closed account again' })
  @ApiOkResponse({ type: PersonDto })
  @ApiProblems('validation', 'notFound')
  async reopen(@Param() { id }: IdParamDto): Promise<PersonDto> {
    return toPersonDto(await this.people.reopen(id));
  }

  @Get(':id/sessions')
  @RequiresPermission('people.read')
  @ApiOperation({ summary: 'The devices on which a person is signed in' })
  @ApiOkResponse({ type: [SessionDto] })
  @ApiProblems('validation', 'notFound')
  async listSessions(
    @Param() { id }: IdParamDto,
    @CurrentUser() { session }: SignedIn,
  ): Promise<SessionDto[]> {
    await this.people.requireExisting(id);
    const sessions = await this.sessions.listLive(id);
    return sessions.map((each) => toSessionDto(each, session.id));
  }

  @Delete(':id/sessions/:sessionId')
  @RequiresPermission('people.write')
  @HttpCode(204)
  @ApiOperation({ summary: "Sign one of a person's devices out" })
  @ApiNoContentResponse()
  @ApiProblems('validation', 'notFound')
  endSession(@Param() { id, sessionId }: PersonSessionParamDto): Promise<void> {
    return this.sessions.end(id, sessionId);
  }
}
