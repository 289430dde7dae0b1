import { ApiPropertyOptional } from '@nestjs/swagger';
import type { TraceListQuery } from '@lampwright/contracts';
import type { Step } from '@lampwright/trace';
import { IsIn, IsOptional, IsString, Matches, MaxLength } from 'class-validator';
import { ID_PATTERN } from '../../common/id-param.dto';
import { PageQueryDto } from '../../common/page-query.dto';
import { STEPS } from './trace-values';

const STATES = ['open', 'signed', 'abandoned'] as const satisfies TraceListQuery['state'][];

/** Query of the list of traces. */
export class TraceListQueryDto extends PageQueryDto implements TraceListQuery {
  @ApiPropertyOptional({ enum: STEPS, enumName: 'Step' })
  @IsOptional()
  @IsIn(STEPS)
  step?: Step;

  @ApiPropertyOptional({ enum: STATES })
  @IsOptional()
  @IsIn(STATES)
  state?: 'open' | 'signed' | 'abandoned';

  @ApiPropertyOptional({ pattern: ID_PATTERN.source })
  @IsOptional()
  @Matches(ID_PATTERN)
  trailerId?: string;

  @ApiPropertyOptional({ pattern: ID_PATTERN.source })
  @IsOptional()
  @Matches(ID_PATTERN)
  authorId?: string;

  @ApiPropertyOptional({ description: 'Id of a circuit that misbehaved.' })
  @IsOptional()
  @IsString()
  @MaxLength(200)
  circuit?: string;
}
