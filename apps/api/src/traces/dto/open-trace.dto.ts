import { ApiProperty } from '@nestjs/swagger';
import type { OpenTraceRequest } from '@lampwright/contracts';
import { IsUUID, Matches } from 'class-validator';
import { ID_PATTERN } from '../../common/id-param.dto';

/** Body that opens a trace. */
export class OpenTraceDto implements OpenTraceRequest {
  @ApiProperty({ format: 'uuid', description: 'Made by the client, so that a repeat is harmless.' })
  @IsUUID()
  id: string;

  @ApiProperty({ pattern: ID_PATTERN.source })
  @Matches(ID_PATTERN)
  trailerId: string;
}
