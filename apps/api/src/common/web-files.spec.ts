import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startTestServer, type TestServer } from '../testing/test-server';

const webDir = mkdtempSync(join(tmpdir(), 'lampwright-web-'));
let server: TestServer;
beforeAll(async () => {
  mkdirSync(join(webDir, 'assets'));
  writeFileSync(join(webDir, 'index.html'), '<!doctype html><title>Lampwright</title>');
  writeFileSync(join(webDir, 'theme.js'), '// theme');
  writeFileSync(join(webDir, 'assets', 'index-4f2a.js'), '// code');
  server = await startTestServer({ webDir });
});
afterAll(async () => {
  await server.close();
  rmSync(webDir, { recursive: true });
});

const get = (path: string) => server.client().get(path);

it.each(['/', '/traces/123', '/index.html', '/apiary'])(
  'answers %s with the page, to be asked for anew',
  async (path) => {
    const { text, headers } = await get(path).expect(200);
    expect(text).toContain('<title>Lampwright</title>');
    expect(headers['content-type']).toMatch(/^text\/html/);
    expect(headers['cache-control']).toBe('no-cache');
  },
);

it('lets a file whose name carries a hash be kept for ever', async () => {
  const { headers } = await get('/assets/index-4f2a.js').expect(200);
  expect(headers['cache-control']).toBe('public, max-age=31536000, immutable');
});

it('has any other file asked for anew', async () => {
  expect((await get('/theme.js').expect(200)).headers['cache-control']).toBe('no-cache');
});

it.each(['/assets/index-old.js', '/assets/', '/api/nowhere', '/api'])(
  'has no page for %s',
  async (path) => {
    const { body } = await get(path).expect(404);
    expect(body.reason).toBe('notFound');
  },
);

it('does not leave the folder', async () => {
  for (const path of ['/..%2fsecret', '/assets/..%2f..%2fsecret', '/%2e%2e/secret']) {
    const { status, text } = await get(path);
    expect([200, 403, 404]).toContain(status);
    expect(text).not.toMatch(/root:|[A-Za-z0-9_-]{64}/);
  }
});

it('refuses a change to anything but the API', async () => {
  await server.client().post('/').expect(404);
});
