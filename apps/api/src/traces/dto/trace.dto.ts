import { ApiProperty } from '@nestjs/swagger';
import type {
  TraceDto as TraceShape,
  TraceSummaryDto as TraceSummaryShape,
} from '@lampwright/contracts';
import type { Step, TraceRecord } from '@lampwright/trace';
import type { Trace } from '../trace.entity';
import { STEPS } from './trace-values';

export class TraceTrailerDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  unit: string;

  @ApiProperty()
  bodyType: string;
}

export class TraceAuthorDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;
}

/** A trace in a list. */
export class TraceSummaryDto implements TraceSummaryShape {
  @ApiProperty()
  id: string;

  @ApiProperty({ type: TraceTrailerDto, description: 'As it stood when the trace was opened.' })
  trailer: TraceTrailerDto;

  @ApiProperty({ type: TraceAuthorDto })
  author: TraceAuthorDto;

  @ApiProperty({ enum: STEPS, enumName: 'Step' })
  step: Step;

  @ApiProperty()
  complaint: string;

  @ApiProperty({ type: [String] })
  circuits: string[];

  @ApiProperty({ type: [String] })
  circuitNames: string[];

  @ApiProperty({ type: 'integer' })
  powerUps: number;

  @ApiProperty({ format: 'date-time' })
  openedAt: string;

  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  signedAt: string | null;

  @ApiProperty({ type: String, nullable: true })
  found: string | null;
}

/** A trace with its events and all they rest on. */
export class TraceDto extends TraceSummaryDto implements TraceShape {
  @ApiProperty({
    type: 'object',
    additionalProperties: true,
    description: 'The record, as stored.',
  })
  record: TraceRecord;

  @ApiProperty()
  writable: boolean;
}

/** `author` and `circuits` must be loaded. */
export function toTraceSummaryDto(trace: Trace): TraceSummaryDto {
  const circuits = trace.circuits.getItems().sort((a, b) => a.position - b.position);
  const { id, unit, bodyType } = trace.trailerSnapshot;
  return {
    id: trace.id,
    trailer: { id, unit, bodyType },
    author: { id: trace.author.id, name: trace.author.name },
    step: trace.step,
    complaint: trace.complaint,
    circuits: circuits.map(({ circuit }) => circuit),
    circuitNames: circuits.map(({ name }) => name),
    powerUps: trace.powerUps,
    openedAt: trace.openedAt.toISOString(),
    signedAt: trace.signedAt?.toISOString() ?? null,
    found: trace.foundLabel,
  };
}
