import { ApiProperty } from '@nestjs/swagger';
import { Matches } from 'class-validator';

/** What the ids in addresses look like. */
export const ID_PATTERN = /^[A-Za-z0-9][A-Za-z0-9._-]{0,63}$/;

/** The id in an address. */
export class IdParamDto {
  @ApiProperty({ pattern: ID_PATTERN.source })
  @Matches(ID_PATTERN)
  id: string;
}
