import { OTHER_TECHNICIAN, startTestServer, TECHNICIAN } from '../testing/test-server';

it('answers guessing with 429 and how long to wait, even for the right password', async () => {
  const server = await startTestServer();
  const attempt = (password: string) =>
    server.client().post('/api/auth/sign-in').send({ email: TECHNICIAN, password });
  for (let i = 0; i < 5; i++) await attempt('a guess').expect(401);

  const { body, headers } = await attempt('thornwick-demo').expect(429);
  expect(body).toMatchObject({ reason: 'tooManyRequests', status: 429 });
  expect(body.retryAfter).toBeGreaterThanOrEqual(1);
  expect(headers['retry-after']).toBe(String(body.retryAfter));
  await server.signedIn(OTHER_TECHNICIAN);
  await server.close();
});

it('limits how often one person may ask, and others not', async () => {
  const server = await startTestServer({ requestsPerMinute: 5 });
  const technician = await server.signedIn(TECHNICIAN);
  const other = await server.signedIn(OTHER_TECHNICIAN);
  for (let i = 0; i < 5; i++) await technician.get('/api/auth/account').expect(200);
  const { body, headers } = await technician.get('/api/auth/account').expect(429);
  expect(body.reason).toBe('tooManyRequests');
  expect(Number(headers['retry-after'])).toBe(body.retryAfter);
  await other.get('/api/auth/account').expect(200);
  await server.close();
});

describe('people who are not signed in', () => {
  const askFrom = async (trustProxy: number | false) => {
    const server = await startTestServer({ requestsPerMinute: 2, trustProxy });
    const ask = (address: string) =>
      server.client().get('/api/health').set('X-Forwarded-For', address);
    await ask('192.0.2.1');
    await ask('192.0.2.1');
    const { status } = await ask('192.0.2.2');
    await server.close();
    return status;
  };

  it('are counted by their address, which they cannot choose', async () => {
    expect(await askFrom(false)).toBe(429);
  });

  it('are told apart behind a proxy that is trusted', async () => {
    expect(await askFrom(1)).toBe(200);
  });
});
