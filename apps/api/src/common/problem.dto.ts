import { applyDecorators } from '@nestjs/common';
import {
  ApiExtraModels,
  ApiProperty,
  ApiPropertyOptional,
  ApiResponse,
  getSchemaPath,
} from '@nestjs/swagger';
import type { FieldProblem, Problem, ProblemReason } from '@lampwright/contracts';
import { PROBLEMS } from './messages';

/** One field at fault, as the OpenAPI document shows it. */
class FieldProblemDto implements FieldProblem {
  @ApiProperty()
  path: string;

  @ApiProperty()
  code: string;

  @ApiProperty()
  message: string;

  @ApiPropertyOptional({ type: 'object', additionalProperties: true })
  params?: Record<string, string | number | string[]>;
}

/** Every error, as the OpenAPI document shows it. */
class ProblemDto implements Problem {
  @ApiProperty({ example: 'urn:lampwright:problem:notFound' })
  type: string;

  @ApiProperty()
  title: string;

  @ApiProperty({ type: 'integer' })
  status: number;

  @ApiProperty()
  detail: string;

  @ApiProperty({ enum: Object.keys(PROBLEMS), enumName: 'ProblemReason' })
  reason: ProblemReason;

  @ApiPropertyOptional({ type: [FieldProblemDto] })
  errors?: FieldProblemDto[];

  @ApiPropertyOptional({ type: 'integer', description: 'Seconds.' })
  retryAfter?: number;

  @ApiPropertyOptional()
  requestId?: string;
}

/** Describes the problems that a route may answer with, grouped by their status. */
export function ApiProblems(...reasons: ProblemReason[]) {
  const statuses = [...new Set(reasons.map((reason) => PROBLEMS[reason].status))];
  return applyDecorators(
    ApiExtraModels(ProblemDto),
    ...statuses.map((status) =>
      ApiResponse({
        status,
        description: reasons.filter((reason) => PROBLEMS[reason].status === status).join(', '),
        content: { 'application/problem+json': { schema: { $ref: getSchemaPath(ProblemDto) } } },
      }),
    ),
  );
}
