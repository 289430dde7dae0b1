import type { AddressInfo } from 'node:net';
import { EntityManager } from '@mikro-orm/better-sqlite';
import { RequestContext } from '@mikro-orm/core';
import request from 'supertest';
import { SessionsService } from '../auth/sessions.service';
import {
  LEAD,
  startTestServer,
  TECHNICIAN,
  type Agent,
  type TestServer,
} from '../testing/test-server';

let server: TestServer;
let lead: Agent;
beforeAll(async () => {
  server = await startTestServer();
  lead = await server.signedIn(LEAD);
});
afterAll(() => server.close());

const jsonBody = (agent: Agent, path: string, body: string) =>
  agent.post(path).set('Content-Type', 'application/json').send(body);

describe('every error', () => {
  it('has the one shape and a request id that the header repeats', async () => {
    const { body, headers } = await lead.get('/api/nowhere').expect(404);
    expect(headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(body).toEqual({
      type: 'urn:lampwright:problem:notFound',
      title: expect.any(String),
      status: 404,
      detail: expect.any(String),
      reason: 'notFound',
      requestId: headers['x-request-id'],
    });
  });

  it.each([
    ['malformed JSON', '/api/people', '{"name":', 400, 'malformedJson'],
    ['a body that is no object', '/api/people', '"text"', 400, 'malformedJson'],
    ['no body', '/api/people', '', 400, 'validation'],
    ['a list for an object', '/api/people', '[1]', 400, 'validation'],
    ['a large body', '/api/people', `{"name":"${'x'.repeat(300_000)}"}`, 413, 'tooLarge'],
    ['a very large plan', '/api/plans', `{"harness":"${'x'.repeat(6_400_000)}"}`, 413, 'tooLarge'],
  ])('answers %s at %s', async (_what, path, text, status, reason) => {
    const { body, headers } = await jsonBody(lead, path, text).expect(status);
    expect(body).toMatchObject({ reason, status });
    expect(body.requestId).toBe(headers['x-request-id']);
  });

  it('does not take a form for JSON', async () => {
    const { body } = await lead.post('/api/people').type('form').send('name=x').expect(400);
    expect(body.reason).toBe('validation');
  });

  it('says which methods an address has', async () => {
    const { body, headers } = await lead.put('/api/plans').expect(405);
    expect(body.reason).toBe('methodNotAllowed');
    expect(headers.allow).toBe('GET, POST');
    await lead.delete('/api/trailers/some-id').expect(405);
    await lead.put('/api/nowhere').expect(404);
  });

  it.each([
    '/api/trailers/%FF',
    '/api/trailers/%00',
    `/api/trailers/${'x'.repeat(100)}`,
    '/api/trailers/a%20b',
  ])('does not fail on the address %s', async (path) => {
    const { status } = await lead.get(path);
    expect([400, 404]).toContain(status);
  });

  it('of a list says which part of the query is wrong', async () => {
    const { body } = await lead.get('/api/trailers?page=0&size=1000&colour=red').expect(400);
    const paths = body.errors.map(({ path }: { path: string }) => path);
    expect(new Set(paths)).toEqual(new Set(['page', 'size', 'colour']));
  });

  it('that nobody foresaw shows no stack', async () => {
    const em = server.app.get(EntityManager);
    const spy = jest
      .spyOn(em.getConnection(), 'execute')
      .mockRejectedValueOnce(new Error('a secret detail'));
    const { body, text } = await server.client().get('/api/health').expect(500);
    spy.mockRestore();
    expect(body).toMatchObject({ reason: 'internal', status: 500 });
    expect(text).not.toMatch(/secret|stack|\.ts/);
  });
});

describe('a change from another site', () => {
  const http = () => server.app.getHttpServer();
  const signOut = () => request(http()).post('/api/auth/sign-out');
  const host = () => `127.0.0.1:${(http().address() as AddressInfo).port}`;

  it.each(['cross-site', 'same-site', 'none'])('is refused (%s)', async (site) => {
    const { body } = await signOut().set('Sec-Fetch-Site', site).expect(403);
    expect(body.reason).toBe('crossSite');
  });

  it('is told from one of the same origin', async () => {
    await signOut().set('Sec-Fetch-Site', 'same-origin').expect(204);
    await signOut().set('Host', host()).set('Origin', `http://${host()}`).expect(204);
  });

  it.each(['http://evil.example', 'null', 'nonsense'])(
    'is refused by its origin %s',
    async (origin) => {
      await signOut().set('Origin', origin).expect(403);
      await signOut().set('Origin', origin).set('X-Lampwright', '1').expect(403);
    },
  );

  it('may come from a program that is no browser and says so', async () => {
    await signOut().expect(403);
    await signOut().set('X-Lampwright', '1').expect(204);
  });
});

describe('headers', () => {
  it('allow scripts of this server alone, and inline ones on the page of the API document only', async () => {
    const script = async (path: string) =>
      /script-src ([^;]*)/.exec((await lead.get(path)).headers['content-security-policy']!)![1];
    expect(await script('/api/health')).toBe("'self'");
    expect(await script('/anything')).toBe("'self'");
    expect(await script('/api/docs')).toBe("'self' 'unsafe-inline'");
  });

  it('say nothing about what the server is made of', async () => {
    const { headers } = await lead.get('/api/health');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['strict-transport-security']).toBeUndefined();
  });
});

it('keeps separate identity maps for requests at the same time', async () => {
  const technician = await server.signedIn(TECHNICIAN);
  const sessions = server.app.get(SessionsService, { strict: false });
  const requireLive = sessions.requireLive.bind(sessions);
  const contexts: unknown[] = [];
  let bothAreHere: () => void;
  const both = new Promise<void>((resolve) => (bothAreHere = resolve));
  const spy = jest.spyOn(sessions, 'requireLive').mockImplementation(async (id) => {
    contexts.push(RequestContext.getEntityManager());
    if (contexts.length === 2) bothAreHere();
    await both;
    return requireLive(id);
  });
  const [one, other] = await Promise.all([
    lead.get('/api/auth/account').expect(200),
    technician.get('/api/auth/account').expect(200),
  ]);
  spy.mockRestore();
  expect([one!.body.role, other!.body.role]).toEqual(['lead', 'technician']);
  expect(contexts.every(Boolean)).toBe(true);
  expect(new Set(contexts).size).toBe(2);
});

it('lets browsers keep nothing of the API without asking again', async () => {
  const first = await lead.get('/api/trailers').expect(200);
  expect(first.headers['cache-control']).toBe('private, no-cache');
  await lead.get('/api/trailers').set('If-None-Match', first.headers['etag']!).expect(304);
});
