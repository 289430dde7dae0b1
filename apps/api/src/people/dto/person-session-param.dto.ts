import { ApiProperty } from '@nestjs/swagger';
import { Matches } from 'class-validator';
import { ID_PATTERN, IdParamDto } from '../../common/id-param.dto';

/** The ids of a person and of one of the person's sessions in an address. */
export class PersonSessionParamDto extends IdParamDto {
  @ApiProperty({ pattern: ID_PATTERN.source })
  @Matches(ID_PATTERN)
  sessionId: string;
}
