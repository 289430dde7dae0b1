import { ApiError, isWorthRetrying } from '../../../lib/api-error';
import type { SendFailure } from './sender';

/** Sorts a failed request by what helps: waiting, signing in, or a person's eyes. */
export function failureOf(error: unknown): SendFailure {
  if (error instanceof ApiError && error.status === 401) return 'signIn';
  if (error instanceof ApiError && error.status === 429) return 'offline';
  return isWorthRetrying(error) ? 'offline' : 'turnedAway';
}
