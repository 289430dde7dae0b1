import { Body, Controller, Get, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Page } from '@lampwright/contracts';
import { RequiresPermission } from '../auth/requires-permission.decorator';
import { IdParamDto } from '../common/id-param.dto';
import { pageOf } from '../common/page.dto';
import { ApiProblems } from '../common/problem.dto';
import { TrailerDto } from './dto/trailer.dto';
import { TrailerListQueryDto } from './dto/trailer-list-query.dto';
import { UpdateTrailerDto, WriteTrailerDto } from './dto/write-trailer.dto';
import { TrailersService } from './trailers.service';

/** The trailers of the yard. */
@ApiTags('trailers')
@Controller('trailers')
export class TrailersController {
  constructor(private readonly trailers: TrailersService) {}

  @Get()
  @RequiresPermission('trailers.read')
  @ApiOperation({ summary: 'List trailers; sort by unit, bodyType, lengthMetres, year or fleet' })
  @ApiOkResponse({ type: pageOf(TrailerDto, 'TrailerPage') })
  @ApiProblems('validation')
  list(@Query() query: TrailerListQueryDto): Promise<Page<TrailerDto>> {
    return this.trailers.list(query);
  }

  @Get(':id')
  @RequiresPermission('trailers.read')
  @ApiOperation({ summary: 'Read a trailer' })
  @ApiOkResponse({ type: TrailerDto })
  @ApiProblems('validation', 'notFound')
  read(@Param() { id }: IdParamDto): Promise<TrailerDto> {
    return this.trailers.read(id);
  }

  @Post()
  @RequiresPermission('trailers.write')
  @ApiOperation({ summary: 'Add a trailer' })
  @ApiCreatedResponse({ type: TrailerDto })
  @ApiProblems('validation', 'conflict')
  create(@Body() body: WriteTrailerDto): Promise<TrailerDto> {
    return this.trailers.create(body);
  }

  @Patch(':id')
  @RequiresPermission('trailers.write')
  @ApiOperation({ summary: 'Change a trailer' })
  @ApiOkResponse({ type: TrailerDto })
  @ApiProblems('validation', 'notFound', 'conflict')
  update(@Param() { id }: IdParamDto, @Body() body: UpdateTrailerDto): Promise<TrailerDto> {
    return this.trailers.update(id, body);
  }
}
