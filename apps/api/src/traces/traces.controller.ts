import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Page } from '@lampwright/contracts';
import { RequiresPermission } from '../auth/requires-permission.decorator';
import { CurrentUser, type SignedIn } from '../auth/signed-in';
import { IdParamDto } from '../common/id-param.dto';
import { pageOf } from '../common/page.dto';
import { ApiProblems } from '../common/problem.dto';
import { TraceDto, TraceSummaryDto } from './dto/trace.dto';
import { TraceListQueryDto } from './dto/trace-list-query.dto';
import { TracesService } from './traces.service';

/** Traces and their events. */
@ApiTags('traces')
@Controller('traces')
export class TracesController {
  constructor(private readonly traces: TracesService) {}

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
}
