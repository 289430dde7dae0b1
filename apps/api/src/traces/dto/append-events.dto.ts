import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type {
  AppendEventsRequest,
  AppendEventsResponse,
  AppendResult,
} from '@lampwright/contracts';
import { TRACE_EVENT_TYPES, type Refusal, type Step, type TraceEvent } from '@lampwright/trace';
import { ArrayMaxSize, ArrayMinSize, IsArray, IsObject } from 'class-validator';
import { STEPS } from './trace-values';

const MAX_BATCH = 100;

/** Body that adds events. What an event must be is the trace machine's to say. */
export class AppendEventsDto implements AppendEventsRequest {
  @ApiProperty({
    type: 'array',
    minItems: 1,
    maxItems: MAX_BATCH,
    description: "In the order of their device's seq.",
    items: {
      type: 'object',
      required: ['id', 'device', 'seq', 'at', 'by', 'type'],
      properties: {
        id: { type: 'string', format: 'uuid' },
        device: { type: 'string', maxLength: 64 },
        seq: { type: 'integer', minimum: 1 },
        at: { type: 'string', format: 'date-time' },
        by: { type: 'string', description: 'Id of the person who is signed in.' },
        type: { type: 'string', enum: TRACE_EVENT_TYPES },
      },
      additionalProperties: true,
    },
  })
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(MAX_BATCH)
  @IsObject({ each: true })
  events: TraceEvent[];
}

class RefusalDto {
  @ApiProperty()
  reason: Refusal['reason'];

  @ApiPropertyOptional({ type: [String] })
  ids?: string[];
}

class AppendResultDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ enum: ['accepted', 'duplicate', 'refused'] })
  outcome: AppendResult['outcome'];

  @ApiPropertyOptional({ type: RefusalDto, description: 'With `refused` alone.' })
  refusal?: RefusalDto;
}

/** One answer an event, and where the trace stands now. */
export class AppendEventsResponseDto implements AppendEventsResponse {
  @ApiProperty({ type: [AppendResultDto] })
  results: AppendResult[];

  @ApiProperty({ enum: STEPS, enumName: 'Step' })
  step: Step;
}
