import type { ProblemReason } from '@lampwright/contracts';

/** HTTP status and English words of every problem; the web has its own words, by `reason`. */
export const PROBLEMS: Record<ProblemReason, { status: number; title: string; detail: string }> = {
  validation: {
    status: 400,
    title: 'The request is not valid',
    detail: 'Some fields are missing, unknown or wrong; see errors.',
  },
  malformedJson: {
    status: 400,
    title: 'The body is not JSON',
    detail: 'The body could not be read as JSON in UTF-8.',
  },
  tooLarge: {
    status: 413,
    title: 'The body is too large',
    detail: 'A plan may have 6 MB, any other body 256 kB.',
  },
  signInFailed: {
    status: 401,
    title: 'Sign-in failed',
    detail: 'No open account has this e-mail address and this password.',
  },
  notSignedIn: {
    status: 401,
    title: 'Not signed in',
    detail: 'Sign in, or refresh the session, and ask again.',
  },
  sessionEnded: {
    status: 401,
    title: 'The session has ended',
    detail: 'This device was signed out, or its session is too old. Sign in again.',
  },
  accountClosed: {
    status: 401,
    title: 'The account is closed',
    detail: 'A lead has closed this account.',
  },
  notAllowed: {
    status: 403,
    title: 'Not allowed',
    detail: 'The role of this account does not permit it.',
  },
  crossSite: {
    status: 403,
    title: 'Refused as a request from another site',
    detail:
      'A change must come from the same origin. A program that is no browser sends the header "X-Lampwright: 1".',
  },
  notFound: { status: 404, title: 'Not found', detail: 'Nothing is stored under this address.' },
  methodNotAllowed: {
    status: 405,
    title: 'Method not allowed',
    detail: 'This address does not answer this method; see the Allow header.',
  },
  conflict: {
    status: 409,
    title: 'In conflict with what is stored',
    detail: 'The change does not fit what is stored now.',
  },
  planFaults: {
    status: 422,
    title: 'The plan has faults',
    detail: 'The plan was not stored. Every fault is listed in errors.',
  },
  tankTrailer: {
    status: 422,
    title: 'No trace on a tank trailer',
    detail: 'Power is never applied to a tank trailer from here; it goes to a certified shop.',
  },
  noPlan: {
    status: 422,
    title: 'The trailer has no plan',
    detail: 'Give the trailer a plan before a trace is opened on it.',
  },
  lastLead: {
    status: 409,
    title: 'The last lead stays',
    detail: 'At least one open account must be a lead.',
  },
  tooManyRequests: {
    status: 429,
    title: 'Too many requests',
    detail: 'Wait for the seconds in retryAfter, then ask again.',
  },
  timeout: {
    status: 503,
    title: 'The request took too long',
    detail: 'The server gave the request up. It is safe to send it again.',
  },
  internal: {
    status: 500,
    title: 'The server failed',
    detail: 'The failure has been logged under the requestId.',
  },
};

/** English words for single fields, where a validator has none of its own. */
export const FIELD_MESSAGES = {
  emailTaken: 'Another person has this e-mail address.',
  unitTaken: 'Another trailer has this unit number.',
  unknownPlan: 'No plan has this id.',
  wrongPassword: 'This is not the current password.',
  staleVersion: 'Somebody changed it in the meantime; read it again.',
  revisionTaken: 'Somebody stored a revision at the same moment; read the plan again.',
  otherTrailer: 'Another trace, on another trailer or by another person, has this id.',
  notThePerson: 'An event carries the id of the person who is signed in.',
  unknownSort: 'Sort by one of these, with a leading - for descending.',
} as const;
