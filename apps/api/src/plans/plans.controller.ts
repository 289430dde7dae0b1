import { Body, Controller, Get, Param, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Page } from '@lampwright/contracts';
import { RequiresPermission } from '../auth/requires-permission.decorator';
import { CurrentUser, type SignedIn } from '../auth/signed-in';
import { IdParamDto } from '../common/id-param.dto';
import { PageQueryDto } from '../common/page-query.dto';
import { pageOf } from '../common/page.dto';
import { ApiProblems } from '../common/problem.dto';
import { PlanDto, PlanSummaryDto } from './dto/plan.dto';
import { RevisionParamDto } from './dto/revision-param.dto';
import { WritePlanDto } from './dto/write-plan.dto';
import { PlansService } from './plans.service';

/** Plans: the harness documents, by revision. */
@ApiTags('plans')
@Controller('plans')
export class PlansController {
  constructor(private readonly plans: PlansService) {}

  @Get()
  @RequiresPermission('plans.read')
  @ApiOperation({ summary: 'List plans; sort by name, parts, circuits or updatedAt' })
  @ApiOkResponse({ type: pageOf(PlanSummaryDto, 'PlanPage') })
  @ApiProblems('validation')
  list(@Query() query: PageQueryDto): Promise<Page<PlanSummaryDto>> {
    return this.plans.list(query);
  }

  @Get(':id')
  @RequiresPermission('plans.read')
  @ApiOperation({ summary: 'Read the newest revision of a plan' })
  @ApiOkResponse({ type: PlanDto })
  @ApiProblems('validation', 'notFound')
  read(@Param() { id }: IdParamDto): Promise<PlanDto> {
    return this.plans.read(id);
  }

  @Get(':id/revisions/:number')
  @RequiresPermission('plans.read')
  @ApiOperation({ summary: 'Read one revision of a plan' })
  @ApiOkResponse({ type: PlanDto })
  @ApiProblems('validation', 'notFound')
  readRevision(@Param() { id, number }: RevisionParamDto): Promise<PlanDto> {
    return this.plans.read(id, number);
  }

  @Post()
  @RequiresPermission('plans.publish')
  @ApiOperation({ summary: 'Store a new plan' })
  @ApiCreatedResponse({ type: PlanDto })
  @ApiProblems('validation', 'malformedJson', 'tooLarge', 'planFaults')
  create(@Body() { harness }: WritePlanDto, @CurrentUser() { person }: SignedIn): Promise<PlanDto> {
    return this.plans.create(harness, person);
  }

  @Post(':id/revisions')
  @RequiresPermission('plans.publish')
  @ApiOperation({ summary: 'Store a new revision of a plan' })
  @ApiCreatedResponse({ type: PlanDto })
  @ApiProblems('validation', 'malformedJson', 'tooLarge', 'planFaults', 'notFound', 'conflict')
  revise(
    @Param() { id }: IdParamDto,
    @Body() { harness }: WritePlanDto,
    @CurrentUser() { person }: SignedIn,
  ): Promise<PlanDto> {
    return this.plans.revise(id, harness, person);
  }
}
