import { ApiProperty, PickType } from '@nestjs/swagger';
import type { DemoDto as Demo } from '@lampwright/contracts';
import { PersonDto } from '../../people/dto/person.dto';

export class DemoPersonDto extends PickType(PersonDto, ['name', 'email', 'role'] as const) {}

export class DemoDto implements Demo {
  @ApiProperty({ type: [DemoPersonDto] })
  people: DemoPersonDto[];

  @ApiProperty({ description: 'One for all of them; empty outside a demo yard.' })
  password: string;
}
