import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import type { UpdateTrailerRequest, WriteTrailerRequest } from '@lampwright/contracts';
import type { BodyType, SecondSource } from '@lampwright/trace';
import {
  ArrayUnique,
  IsArray,
  IsBoolean,
  IsIn,
  IsInt,
  IsNumber,
  IsOptional,
  IsString,
  Matches,
  Max,
  MaxLength,
  Min,
  MinLength,
} from 'class-validator';
import { ID_PATTERN } from '../../common/id-param.dto';
import { BODY_TYPES, SECOND_SOURCES } from './trailer-values';

/** Body of a new trailer. */
export class WriteTrailerDto implements WriteTrailerRequest {
  @ApiProperty({ minLength: 1, maxLength: 40 })
  @IsString()
  @MinLength(1)
  @MaxLength(40)
  unit: string;

  @ApiProperty({ enum: BODY_TYPES, enumName: 'BodyType' })
  @IsIn(BODY_TYPES)
  bodyType: BodyType;

  @ApiProperty({ minimum: 1, maximum: 40 })
  @IsNumber()
  @Min(1)
  @Max(40)
  lengthMetres: number;

  @ApiProperty({ minimum: 0.5, maximum: 6 })
  @IsNumber()
  @Min(0.5)
  @Max(6)
  widthMetres: number;

  @ApiProperty({ type: 'integer', minimum: 1900, maximum: 2100 })
  @IsInt()
  @Min(1900)
  @Max(2100)
  year: number;

  @ApiPropertyOptional({ type: String, nullable: true, maxLength: 20 })
  @IsOptional()
  @IsString()
  @MaxLength(20)
  plate?: string | null;

  @ApiProperty({ maxLength: 100 })
  @IsString()
  @MaxLength(100)
  fleet: string;

  @ApiPropertyOptional({ maxLength: 4000 })
  @IsOptional()
  @IsString()
  @MaxLength(4000)
  notes?: string;

  @ApiProperty({ enum: SECOND_SOURCES, isArray: true, enumName: 'SecondSource' })
  @IsArray()
  @ArrayUnique()
  @IsIn(SECOND_SOURCES, { each: true })
  secondSources: SecondSource[];

  @ApiProperty()
  @IsBoolean()
  abs: boolean;

  @ApiPropertyOptional({ type: String, nullable: true, pattern: ID_PATTERN.source })
  @IsOptional()
  @Matches(ID_PATTERN)
  planId?: string | null;
}

/** Body of a change to a trailer; what is left out stays. */
export class UpdateTrailerDto
  extends PartialType(WriteTrailerDto, { skipNullProperties: false })
  implements UpdateTrailerRequest
{
  @ApiPropertyOptional({ type: 'integer', minimum: 1, description: 'The version that was read.' })
  @IsOptional()
  @IsInt()
  @Min(1)
  version?: number;
}
