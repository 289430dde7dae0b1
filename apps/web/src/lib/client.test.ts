// @vitest-environment jsdom
import { fakeServer, nothing, ok, problem } from '../testing/fake-server';
import { ApiError, NetworkError } from './api-error';
import { api } from './client';
import { reachability } from './reachability';
import { sessionEnd } from './session-end';

const stale = problem(401, 'notSignedIn');

describe('the client', () => {
  it('sends the header that a form of another site cannot', async () => {
    let header: string | null = null;
    fakeServer({});
    const answer = globalThis.fetch;
    vi.stubGlobal('fetch', (input: RequestInfo | URL, init?: RequestInit) => {
      header = new Request(input, init).headers.get('X-Lampwright');
      return answer(input, init);
    });
    await expect(api.get('health')).rejects.toThrow(ApiError);
    expect(header).toBe('1');
  });

  it('leaves out what a query does not say', async () => {
    const server = fakeServer({ 'GET trailers': ok({ items: [] }) });
    await api.get('trailers', { page: 2, search: '', bodyType: undefined });
    expect(server.calls[0]?.path).toBe('trailers?page=2');
  });

  it('refreshes a stale session once for all requests that met it, and repeats them', async () => {
    let fresh = false;
    const server = fakeServer({
      'GET trailers': () => (fresh ? ok(['van']) : stale),
      'GET plans': () => (fresh ? ok(['plan']) : stale),
      'POST auth/refresh': () => {
        fresh = true;
        return ok({});
      },
    });
    await expect(Promise.all([api.get('trailers'), api.get('plans')])).resolves.toEqual([
      ['van'],
      ['plan'],
    ]);
    expect(server.sent('POST auth/refresh')).toHaveLength(1);
  });

  it('ends the session only when the server refuses to refresh it', async () => {
    const ended = vi.fn();
    const forget = sessionEnd.subscribe(ended);
    const server = fakeServer({ 'GET trailers': stale, 'POST auth/refresh': 'unreachable' });
    await expect(api.get('trailers')).rejects.toThrow(NetworkError);
    expect(ended).not.toHaveBeenCalled();

    server.set('POST auth/refresh', problem(401, 'sessionEnded'));
    await expect(api.get('trailers')).rejects.toMatchObject({ reason: 'sessionEnded' });
    expect(ended).toHaveBeenCalledOnce();
    forget();
  });

  it('does not repeat for ever when the fresh session is refused too', async () => {
    const server = fakeServer({ 'GET trailers': stale, 'POST auth/refresh': nothing });
    await expect(api.get('trailers')).rejects.toMatchObject({ reason: 'notSignedIn' });
    expect(server.sent('GET trailers')).toHaveLength(2);
  });

  it('takes the 401 of a sign-in as the answer', async () => {
    const server = fakeServer({ 'POST auth/sign-in': problem(401, 'signInFailed') });
    await expect(api.post('auth/sign-in', {}, { refresh: false })).rejects.toMatchObject({
      reason: 'signInFailed',
    });
    expect(server.sent('POST auth/refresh')).toHaveLength(0);
  });

  it('carries the fields of a refusal', async () => {
    const errors = [{ path: 'unit', code: 'unitTaken', message: 'Taken.' }];
    fakeServer({ 'POST trailers': problem(409, 'conflict', { errors }) });
    await expect(api.post('trailers', {})).rejects.toMatchObject({
      status: 409,
      reason: 'conflict',
      fields: errors,
    });
  });

  it('reads a refusal that is no problem document by its status', async () => {
    fakeServer({ 'GET plans': { status: 413, body: 'Too large' } });
    await expect(api.get('plans')).rejects.toMatchObject({ reason: 'tooLarge', problem: null });
  });

  it('knows whether the last request got through', async () => {
    const server = fakeServer({ 'GET plans': 'unreachable' });
    await expect(api.get('plans')).rejects.toThrow(NetworkError);
    expect(reachability.get()).toBe(false);
    server.set('GET plans', ok([]));
    await api.get('plans');
    expect(reachability.get()).toBe(true);
  });
});
