import { ApiPropertyOptional } from '@nestjs/swagger';
import type { PageQuery } from '@lampwright/contracts';
import { Type } from 'class-transformer';
import { IsInt, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';

/** The query of every list. */
export class PageQueryDto implements PageQuery {
  @ApiPropertyOptional({ type: 'integer', minimum: 1, default: 1 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  page: number = 1;

  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: 100, default: 25 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(100)
  size: number = 25;

  @ApiPropertyOptional({ description: 'Words to look for.', maxLength: 100 })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  search?: string;

  @ApiPropertyOptional({ description: 'A field name, with a leading - for descending.' })
  @IsOptional()
  @IsString()
  @MaxLength(40)
  sort?: string;
}
