import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Page } from '@lampwright/contracts';
import { RequiresPermission } from '../auth/requires-permission.decorator';
import { CurrentUser, type SignedIn } from '../auth/signed-in';
import { IdParamDto } from '../common/id-param.dto';
import { pageOf } from '../common/page.dto';
import { ApiProblems } from '../common/problem.dto';
import { AppendEventsDto, AppendEventsResponseDto } from './dto/append-events.dto';
import { OpenTraceDto } from './dto/open-trace.dto';
import { TraceDto, TraceSummaryDto } from './dto/trace.dto';
import { TraceListQueryDto } from './dto/trace-list-query.dto';
import { TraceWritingService } from './trace-writing.service';
import { TracesService } from './traces.service';

/** Traces and their events. */
@ApiTags('traces')
@Controller('traces')
export class TracesController {
  constructor(
    private readonly traces: TracesService,
    private readonly writing: TraceWritingService,
  ) {}

  @Get()
  @RequiresPermission('traces.readOwn')
  @ApiOperation({
    summary:
      'List traces, the own ones or all by role; sort by openedAt, signedAt, step, powerUps, complaint, found, trailer or author',
  })
  @ApiOkResponse({ type: pageOf(TraceSummaryDto, 'TracePage') })
  @ApiProblems('validation')
  list(
    @Query() query: TraceListQueryDto,
    @CurrentUser() { person }: SignedIn,
  ): Promise<Page<TraceSummaryDto>> {
    return this.traces.list(query, person);
  }

  @Get(':id')
  @RequiresPermission('traces.readOwn')
  @ApiOperation({ summary: 'Read a trace with its events' })
  @ApiOkResponse({ type: TraceDto })
  @ApiProblems('validation', 'notFound')
  read(@Param() { id }: IdParamDto, @CurrentUser() { person }: SignedIn): Promise<TraceDto> {
    return this.traces.read(id, person);
  }

  @Post()
  @RequiresPermission('traces.run')
  @ApiOperation({ summary: 'Open a trace; the same request again is answered in the same way' })
  @ApiCreatedResponse({ type: TraceDto })
  @ApiProblems('validation', 'notFound', 'conflict', 'tankTrailer', 'noPlan')
  async open(@Body() body: OpenTraceDto, @CurrentUser() { person }: SignedIn): Promise<TraceDto> {
    await this.writing.open(body, person);
    return this.traces.read(body.id, person);
  }

  @Post(':id/events')
  @RequiresPermission('traces.run')
  @HttpCode(200)
  @ApiOperation({
    summary: 'Add events; each is accepted, known already, or refused with a reason',
  })
  @ApiOkResponse({ type: AppendEventsResponseDto })
  @ApiProblems('validation', 'notFound', 'tooLarge')
  append(
    @Param() { id }: IdParamDto,
    @Body() { events }: AppendEventsDto,
    @CurrentUser() { person }: SignedIn,
  ): Promise<AppendEventsResponseDto> {
    return this.writing.append(id, events, person);
  }
}
