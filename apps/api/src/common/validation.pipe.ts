import { ValidationPipe, type ValidationError } from '@nestjs/common';
import type { FieldProblem } from '@lampwright/contracts';
import { ProblemException } from './problem.exception';

/** The global pipe: unknown fields are refused, and every field at fault is named with what would be right. */
export function createValidationPipe(): ValidationPipe {
  return new ValidationPipe({
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: true,
    transform: true,
    stopAtFirstError: false,
    validationError: { target: false, value: false },
    exceptionFactory: (errors) =>
      new ProblemException('validation', { errors: errors.flatMap((error) => flatten(error, '')) }),
  });
}

function flatten(error: ValidationError, parent: string): FieldProblem[] {
  const path = join(parent, error.property ?? '');
  const own = Object.entries(error.constraints ?? {}).map(([code, message]) => ({
    path,
    code,
    message,
  }));
  return [...own, ...(error.children ?? []).flatMap((child) => flatten(child, path))];
}

function join(parent: string, property: string): string {
  if (/^\d+$/.test(property)) return `${parent}[${property}]`;
  return parent ? `${parent}.${property}` : property;
}
