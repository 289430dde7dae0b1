import { ApiProperty } from '@nestjs/swagger';
import type { WritePlanRequest } from '@lampwright/contracts';
import { IsDefined } from 'class-validator';

/** Body of a new plan or revision. What the document must be is the harness reader's to say. */
export class WritePlanDto implements WritePlanRequest {
  @ApiProperty({
    type: 'object',
    additionalProperties: true,
    description: 'A harness document, lampwright-harness/1.',
  })
  @IsDefined()
  harness: unknown;
}
