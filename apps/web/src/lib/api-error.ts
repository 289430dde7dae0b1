import type { FieldProblem, Problem, ProblemReason } from '@lampwright/contracts';

/** The server answered, and said no. `reason` is what screens turn into words. */
export class ApiError extends Error {
  override readonly name = 'ApiError';

  constructor(
    readonly status: number,
    readonly reason: ProblemReason,
    readonly problem: Problem | null,
  ) {
    super(problem?.detail ?? `The server answered ${status}.`);
  }

  get fields(): FieldProblem[] {
    return this.problem?.errors ?? [];
  }
}

/** No answer: no signal, a server that is down, or one that took too long. Nothing is known to be lost. */
export class NetworkError extends Error {
  override readonly name = 'NetworkError';

  constructor(cause: unknown) {
    super('The server could not be reached.', { cause });
  }
}

/** Whether trying the same request again could help. */
export function isWorthRetrying(error: unknown): boolean {
  return !(error instanceof ApiError) || error.status >= 500;
}
