/** The one shape of every error the API answers with: RFC 9457 problem details (`application/problem+json`). */
export interface Problem {
  /** `urn:lampwright:problem:<reason>`. */
  type: string;
  title: string;
  status: number;
  /** A sentence for a person who reads logs; screens use `reason` and their own words. */
  detail: string;
  reason: ProblemReason;
  /** The fields at fault, where there are any. */
  errors?: FieldProblem[];
  /** Seconds to wait, for `tooManyRequests`. */
  retryAfter?: number;
  requestId?: string;
}

export interface FieldProblem {
  /** `circuits[0].id`, `password`, ... */
  path: string;
  /** A harness fault code, a refusal reason or a validator's name. */
  code: string;
  /** What is wrong and what would be right, in English. */
  message: string;
  params?: Record<string, string | number | string[]>;
}

export type ProblemReason =
  | 'validation'
  | 'malformedJson'
  | 'tooLarge'
  | 'signInFailed'
  | 'notSignedIn'
  | 'sessionEnded'
  | 'accountClosed'
  | 'notAllowed'
  | 'crossSite'
  | 'notFound'
  | 'methodNotAllowed'
  | 'conflict'
  | 'planFaults'
  | 'tankTrailer'
  /** The trailer has no plan yet, so there is nothing to narrow on. */
  | 'noPlan'
  | 'lastLead'
  | 'tooManyRequests'
  | 'timeout'
  | 'internal';
