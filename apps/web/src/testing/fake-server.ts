import type { Problem, ProblemReason } from '@lampwright/contracts';

interface Call {
  method: string;
  /** Path below /api, with the query. */
  path: string;
  body: unknown;
}

type Answer = { status: number; body?: unknown } | 'unreachable';
type Handler = (call: Call) => Answer;

/** An answer with a body. */
export const ok = (body: unknown): Answer => ({ status: 200, body });
export const nothing: Answer = { status: 204 };

/** The problem document that the API answers a refusal with. */
export function problem(
  status: number,
  reason: ProblemReason,
  more: Partial<Problem> = {},
): Answer {
  const type = `urn:lampwright:problem:${reason}`;
  return { status, body: { type, title: reason, status, detail: reason, reason, ...more } };
}

/**
 * Stands in for the network. Routes are `GET trailers/t1`, the query left out; the newest answer for a route counts.
 * A request that no route answers fails the test by a 500 with its name.
 */
export function fakeServer(routes: Record<string, Answer | Handler>) {
  const answers = new Map(Object.entries(routes));
  const calls: Call[] = [];

  const fetch = async (input: RequestInfo | URL, init?: RequestInit): Promise<Response> => {
    const request = new Request(input, init);
    const { pathname, search } = new URL(request.url);
    const path = pathname.replace(/^\/api\//, '');
    const text = await request.text();
    const call = {
      method: request.method,
      path: path + search,
      body: text === '' ? undefined : JSON.parse(text),
    };
    calls.push(call);
    const found = answers.get(`${request.method} ${path}`);
    const answer =
      typeof found === 'function'
        ? found(call)
        : (found ??
          problem(500, 'internal', { detail: `No answer for ${request.method} ${path}` }));
    if (answer === 'unreachable') throw new TypeError('Failed to fetch');
    return new Response(answer.body === undefined ? null : JSON.stringify(answer.body), {
      status: answer.status,
      headers: { 'Content-Type': 'application/json' },
    });
  };
  vi.stubGlobal('fetch', fetch);

  return {
    calls,
    /** The calls of one route, in order. */
    sent: (route: string) =>
      calls.filter(({ method, path }) => `${method} ${path.split('?')[0]}` === route),
    set: (route: string, answer: Answer | Handler) => answers.set(route, answer),
  };
}
