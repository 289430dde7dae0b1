import { ApiProperty } from '@nestjs/swagger';
import type {
  PlanDto as PlanShape,
  PlanSummaryDto as PlanSummaryShape,
} from '@lampwright/contracts';
import type { Harness } from '@lampwright/harness';
import type { Plan } from '../plan.entity';
import type { PlanRevision } from '../plan-revision.entity';

/** A plan in a list. */
export class PlanSummaryDto implements PlanSummaryShape {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;

  @ApiProperty({ type: 'integer', description: 'Number of the revision, from 1.' })
  revision: number;

  @ApiProperty({ type: 'integer' })
  parts: number;

  @ApiProperty({ type: 'integer' })
  circuits: number;

  @ApiProperty({ format: 'date-time' })
  updatedAt: string;
}

/** A plan with the harness document of one revision. */
export class PlanDto extends PlanSummaryDto implements PlanShape {
  @ApiProperty({
    type: 'object',
    additionalProperties: true,
    description: 'A harness document, lampwright-harness/1.',
  })
  harness: Harness;
}

export function toPlanSummaryDto(plan: Plan): PlanSummaryDto {
  return {
    id: plan.id,
    name: plan.name,
    revision: plan.revision,
    parts: plan.parts,
    circuits: plan.circuits,
    updatedAt: plan.updatedAt.toISOString(),
  };
}

/** `revision.harness` must be loaded. */
export function toPlanDto(plan: Plan, revision: PlanRevision): PlanDto {
  const { harness } = revision;
  return {
    id: plan.id,
    name: harness.name,
    revision: revision.number,
    parts: harness.parts.length,
    circuits: harness.circuits.length,
    updatedAt: revision.createdAt.toISOString(),
    harness,
  };
}
