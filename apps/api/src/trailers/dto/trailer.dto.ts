import { ApiProperty } from '@nestjs/swagger';
import type { TrailerDto as TrailerShape } from '@lampwright/contracts';
import type { BodyType, SecondSource } from '@lampwright/trace';
import type { Trailer } from '../trailer.entity';
import { BODY_TYPES, SECOND_SOURCES } from './trailer-values';

/** The plan a trailer is wired by. */
export class TrailerPlanDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;

  @ApiProperty({ type: 'integer' })
  revision: number;
}

/** A trailer of the yard. */
export class TrailerDto implements TrailerShape {
  @ApiProperty()
  id: string;

  @ApiProperty()
  unit: string;

  @ApiProperty({ enum: BODY_TYPES, enumName: 'BodyType' })
  bodyType: BodyType;

  @ApiProperty()
  lengthMetres: number;

  @ApiProperty()
  widthMetres: number;

  @ApiProperty({ type: 'integer' })
  year: number;

  @ApiProperty({ type: String, nullable: true })
  plate: string | null;

  @ApiProperty()
  fleet: string;

  @ApiProperty()
  notes: string;

  @ApiProperty({ enum: SECOND_SOURCES, isArray: true, enumName: 'SecondSource' })
  secondSources: SecondSource[];

  @ApiProperty()
  abs: boolean;

  @ApiProperty({ type: TrailerPlanDto, nullable: true })
  plan: TrailerPlanDto | null;

  @ApiProperty({ type: String, nullable: true })
  openTraceId: string | null;

  @ApiProperty({ type: 'integer' })
  version: number;
}

/** `trailer.plan` must be loaded. */
export function toTrailerDto(trailer: Trailer, openTraceId: string | null): TrailerDto {
  const { plan } = trailer;
  return {
    id: trailer.id,
    unit: trailer.unit,
    bodyType: trailer.bodyType,
    lengthMetres: trailer.lengthMetres,
    widthMetres: trailer.widthMetres,
    year: trailer.year,
    plate: trailer.plate,
    fleet: trailer.fleet,
    notes: trailer.notes,
    secondSources: trailer.secondSources,
    abs: trailer.abs,
    plan: plan && { id: plan.id, name: plan.name, revision: plan.revision },
    openTraceId,
    version: trailer.version,
  };
}
