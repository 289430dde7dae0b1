import type { Problem, ProblemReason } from '@lampwright/contracts';
import ky, { HTTPError } from 'ky';
import { ApiError, NetworkError } from './api-error';
import { reachability } from './reachability';
import { sessionEnd } from './session-end';

export type Query = object;

interface Call {
  method: 'get' | 'post' | 'patch' | 'delete';
  path: string;
  body?: unknown;
  query?: Query;
  /** False for signing in and refreshing: their 401 is an answer, not a stale session. */
  refresh?: boolean;
}

const http = ky.create({
  prefixUrl: new URL('/api', window.location.origin),
  credentials: 'same-origin',
  // Another site cannot set this header, so a forged form is refused.
  headers: { 'X-Lampwright': '1' },
  retry: 0,
  timeout: 15_000,
  fetch: (input, init) => globalThis.fetch(input, init),
});

function isProblem(body: unknown): body is Problem {
  return typeof body === 'object' && body !== null && 'reason' in body && 'status' in body;
}

const reasons: Record<number, ProblemReason> = {
  401: 'notSignedIn',
  403: 'notAllowed',
  404: 'notFound',
  409: 'conflict',
  413: 'tooLarge',
  429: 'tooManyRequests',
};

async function refused(response: Response): Promise<ApiError> {
  const text = await response.text();
  let body: unknown = null;
  try {
    body = JSON.parse(text);
  } catch (error) {
    // A proxy answers in HTML; the status is then all there is to go by.
    if (!(error instanceof SyntaxError)) throw error;
  }
  if (isProblem(body)) return new ApiError(response.status, body.reason, body);
  return new ApiError(response.status, reasons[response.status] ?? 'internal', null);
}

function searchParams(query: Query): URLSearchParams {
  const params = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== '' && value !== null) params.set(name, String(value));
  }
  return params;
}

async function send<T>({ method, path, body, query }: Call): Promise<T> {
  let response: Response;
  try {
    response = await http(path, {
      method,
      ...(body === undefined ? {} : { json: body }),
      ...(query ? { searchParams: searchParams(query) } : {}),
    });
  } catch (error) {
    if (error instanceof HTTPError) {
      // 502 to 504 come from a proxy before a server that is not there.
      reachability.set(![502, 503, 504].includes(error.response.status));
      throw await refused(error.response);
    }
    reachability.set(false);
    throw new NetworkError(error);
  }
  reachability.set(true);
  const text = await response.text();
  // An empty answer is what a route without a body promises; the caller's type says so.
  return (text === '' ? undefined : JSON.parse(text)) as T;
}

let refreshing: Promise<unknown> | null = null;

/** One refresh serves every request that met the same stale session. */
function refreshOnce(): Promise<unknown> {
  refreshing ??= send<unknown>({ method: 'post', path: 'auth/refresh' }).finally(() => {
    refreshing = null;
  });
  return refreshing;
}

const isStale = (error: unknown) => error instanceof ApiError && error.status === 401;

async function call<T>(request: Call): Promise<T> {
  try {
    return await send<T>(request);
  } catch (error) {
    if (request.refresh === false || !isStale(error)) throw error;
  }
  try {
    await refreshOnce();
  } catch (error) {
    // Only the server's own no ends a session; a lost signal never does.
    if (isStale(error)) sessionEnd.announce();
    throw error;
  }
  return send<T>(request);
}

/**
 * The one way to the server. A stale session is refreshed once and the request repeated; the page is never reloaded
 * and nothing kept on this device is dropped. Throws `ApiError` or `NetworkError`.
 */
export const api = {
  get: <T>(path: string, query?: Query) =>
    call<T>({ method: 'get', path, ...(query ? { query } : {}) }),
  post: <T>(path: string, body?: unknown, options: Pick<Call, 'refresh'> = {}) =>
    call<T>({ method: 'post', path, body, ...options }),
  patch: <T>(path: string, body: unknown) => call<T>({ method: 'patch', path, body }),
  delete: <T = undefined>(path: string) => call<T>({ method: 'delete', path }),
};
