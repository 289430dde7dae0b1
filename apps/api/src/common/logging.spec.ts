import { createServer } from 'node:http';
import { Writable } from 'node:stream';
import pinoHttp, { type Options } from 'pino-http';
import request from 'supertest';
import { loggerOptions } from './logging';

/** What one request leaves in the log. */
async function logOf(status: number, level = 'info'): Promise<string> {
  let log = '';
  const sink = new Writable({
    write(chunk, _encoding, done) {
      log += String(chunk);
      done();
    },
  });
  const logger = pinoHttp(loggerOptions(level).pinoHttp as Options, sink);
  const server = createServer((incoming, response) => {
    incoming.id = 'request-1';
    logger(incoming, response);
    response.statusCode = status;
    response.end();
  });
  await request(server)
    .get('/api/people?search=Ruben')
    .set('Cookie', 'lampwright=token')
    .set('X-Forwarded-For', '192.0.2.7');
  return log;
}

it('keeps the request id, the method, the path and the status, and nothing about a person', async () => {
  const log = await logOf(200);
  expect(JSON.parse(log)).toMatchObject({
    level: 30,
    req: { id: 'request-1', method: 'GET', path: '/api/people' },
    res: { status: 200 },
  });
  expect(log).not.toMatch(/Ruben|token|192\.0\.2|127\.0\.0\.1/);
});

it('is quiet about what went well unless asked, and never about a failure', async () => {
  expect(await logOf(200, 'warn')).toBe('');
  expect(JSON.parse(await logOf(500, 'warn')).level).toBe(50);
});
