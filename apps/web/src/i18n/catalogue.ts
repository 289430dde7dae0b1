import account from './en/account';
import auth from './en/auth';
import common from './en/common';
import drawing from './en/drawing';
import errors from './en/errors';
import faults from './en/faults';
import people from './en/people';
import plans from './en/plans';
import trace from './en/trace';
import traces from './en/traces';
import trailers from './en/trailers';
import yard from './en/yard';

/** Every word of the program, a namespace a feature. */
export const catalogue = {
  account,
  auth,
  common,
  drawing,
  errors,
  faults,
  people,
  plans,
  trace,
  traces,
  trailers,
  yard,
} as const;
