import type { PersonDto } from './people';

/** Who can be tried in a yard of invented data; nobody outside one. */
export interface DemoDto {
  people: Pick<PersonDto, 'name' | 'email' | 'role'>[];
  /** One for all of them; empty outside a demo yard. */
  password: string;
}
