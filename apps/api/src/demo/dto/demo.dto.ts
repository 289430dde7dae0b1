import { ApiProperty, PickType } from '@nestjs/swagger';
import type { DemoDto as DemoShape } from '@lampwright/contracts';
import { PersonDto } from '../../people/dto/person.dto';

export class DemoPersonDto extends PickType(PersonDto, ['name', 'email', 'role'] as const) {}

/** Who can be tried in a demo yard. */
export class DemoDto implements DemoShape {
  @ApiProperty({ type: [DemoPersonDto] })
  people: DemoPersonDto[];

  @ApiProperty({ description: 'One for all of them; empty outside a demo yard.' })
  password: string;
}
