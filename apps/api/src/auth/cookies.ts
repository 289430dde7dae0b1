import type { CookieOptions, Request, Response } from 'express';

export const ACCESS_SECONDS = 15 * 60;
export const REFRESH_SECONDS = 30 * 24 * 60 * 60;
const REFRESH_PATH = '/api/auth';

/** The two tokens of a session. */
export interface Tokens {
  access: string;
  refresh: string;
}

/** Names of the cookies; the prefixes make browsers insist on HTTPS (and, for `__Host-`, on the whole host). */
export function cookieNames(https: boolean) {
  return https
    ? { access: '__Host-lampwright', refresh: '__Secure-lampwright-refresh' }
    : { access: 'lampwright', refresh: 'lampwright-refresh' };
}

function options(https: boolean, path: string): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', secure: https, path };
}

export function setTokens(response: Response, tokens: Tokens, https: boolean): void {
  const names = cookieNames(https);
  response.cookie(names.access, tokens.access, {
    ...options(https, '/'),
    maxAge: ACCESS_SECONDS * 1000,
  });
  response.cookie(names.refresh, tokens.refresh, {
    ...options(https, REFRESH_PATH),
    maxAge: REFRESH_SECONDS * 1000,
  });
}

export function clearTokens(response: Response, https: boolean): void {
  const names = cookieNames(https);
  response.clearCookie(names.access, options(https, '/'));
  response.clearCookie(names.refresh, options(https, REFRESH_PATH));
}

/** Reads one of the cookies; `null` where there is none. */
export function readToken(
  request: Request,
  which: 'access' | 'refresh',
  https: boolean,
): string | null {
  const cookies = request.cookies as Record<string, unknown> | undefined;
  const value = cookies?.[cookieNames(https)[which]];
  return typeof value === 'string' && value !== '' ? value : null;
}
