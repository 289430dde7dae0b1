import { ApiProperty } from '@nestjs/swagger';
import {
  may,
  PERMISSIONS,
  type AccountDto as AccountShape,
  type Permission,
} from '@lampwright/contracts';
import { PersonDto, toPersonDto } from '../../people/dto/person.dto';
import type { Person } from '../../people/person.entity';
import { PreferencesDto } from './update-account.dto';

/** The person who is signed in, with what the role permits. */
export class AccountDto extends PersonDto implements AccountShape {
  @ApiProperty({ type: PreferencesDto })
  preferences: Required<PreferencesDto>;

  @ApiProperty({ enum: Object.keys(PERMISSIONS), isArray: true, enumName: 'Permission' })
  permissions: Permission[];
}

export function toAccountDto(person: Person): AccountDto {
  const permissions = Object.keys(PERMISSIONS) as Permission[];
  return {
    ...toPersonDto(person),
    preferences: person.preferences,
    permissions: permissions.filter((permission) => may(person.role, permission)),
  };
}
