import { HttpException } from '@nestjs/common';
import type { FieldProblem, ProblemReason } from '@lampwright/contracts';
import { PROBLEMS } from './messages';

/** What a problem may carry besides its reason. */
export interface ProblemExtras {
  errors?: FieldProblem[];
  /** Seconds. */
  retryAfter?: number;
  /** Replaces the reason's own sentence where there is more to say. */
  detail?: string;
}

/** The one exception that the API's own code throws; status and words follow from the reason. */
export class ProblemException extends HttpException {
  constructor(
    readonly reason: ProblemReason,
    readonly extras: ProblemExtras = {},
  ) {
    super(PROBLEMS[reason].title, PROBLEMS[reason].status);
  }

  /** A problem about one field. */
  static field(
    reason: ProblemReason,
    path: string,
    code: string,
    message: string,
    params?: FieldProblem['params'],
  ) {
    return new ProblemException(reason, {
      errors: [{ path, code, message, ...(params && { params }) }],
    });
  }
}
