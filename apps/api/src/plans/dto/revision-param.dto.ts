import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, Min } from 'class-validator';
import { IdParamDto } from '../../common/id-param.dto';

/** The id of a plan and the number of a revision in an address. */
export class RevisionParamDto extends IdParamDto {
  @ApiProperty({ type: 'integer', minimum: 1 })
  @Type(() => Number)
  @IsInt()
  @Min(1)
  number: number;
}
