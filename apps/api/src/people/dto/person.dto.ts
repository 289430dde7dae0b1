import { ApiProperty } from '@nestjs/swagger';
import { ROLES, type PersonDto as PersonShape, type Role } from '@lampwright/contracts';
import type { Person } from '../person.entity';

/** A person as leads see them. */
export class PersonDto implements PersonShape {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;

  @ApiProperty()
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  role: Role;

  @ApiProperty()
  closed: boolean;

  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  lastSignInAt: string | null;
}

export function toPersonDto(person: Person): PersonDto {
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    role: person.role,
    closed: person.closed,
    lastSignInAt: person.lastSignInAt?.toISOString() ?? null,
  };
}
