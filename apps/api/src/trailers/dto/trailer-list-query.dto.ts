import { ApiPropertyOptional } from '@nestjs/swagger';
import type { TrailerListQuery } from '@lampwright/contracts';
import type { BodyType } from '@lampwright/trace';
import { IsIn, IsOptional } from 'class-validator';
import { PageQueryDto } from '../../common/page-query.dto';
import { BODY_TYPES } from './trailer-values';

/** Query of the list of trailers. */
export class TrailerListQueryDto extends PageQueryDto implements TrailerListQuery {
  @ApiPropertyOptional({ enum: BODY_TYPES, enumName: 'BodyType' })
  @IsOptional()
  @IsIn(BODY_TYPES)
  bodyType?: BodyType;
}
