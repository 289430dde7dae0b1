import { Clock } from '../common/clock';
import {
  LEAD,
  personId,
  startTestServer,
  TECHNICIAN,
  type TestServer,
} from '../testing/test-server';

let server: TestServer;
beforeEach(async () => {
  server = await startTestServer();
});
afterEach(async () => {
  jest.restoreAllMocks();
  await server.close();
});

const MINUTE_MS = 60_000;

/** Moves the server's clock on, and with it all later ones. */
function later(milliseconds: number): void {
  const now = Date.now() + milliseconds;
  jest.spyOn(server.app.get(Clock), 'now').mockImplementation(() => new Date(now));
}

async function signInForTokens(): Promise<string> {
  const response = await server
    .client()
    .post('/api/auth/sign-in')
    .send({ email: TECHNICIAN, password: 'thornwick-demo' });
  return refreshCookie(response.headers['set-cookie']);
}

function refreshCookie(header: unknown): string {
  const cookie = (header as string[]).find((each) => each.startsWith('lampwright-refresh='));
  return cookie!.split(';')[0]!;
}

const refreshWith = (cookie: string) =>
  server.client().post('/api/auth/refresh').set('Cookie', cookie);

describe('a refresh token', () => {
  it('is replaced at every use, and the new one works', async () => {
    const first = await signInForTokens();
    const answer = await refreshWith(first).expect(200);
    const second = refreshCookie(answer.headers['set-cookie']);
    expect(second).not.toBe(first);
    await refreshWith(second).expect(200);
  });

  it('works a moment longer, for its answer may have been lost', async () => {
    const first = await signInForTokens();
    await refreshWith(first).expect(200);
    const again = await refreshWith(first).expect(200);
    await refreshWith(refreshCookie(again.headers['set-cookie'])).expect(200);
  });

  it('used by two tabs at once lets both go on', async () => {
    const first = await signInForTokens();
    const answers = await Promise.all([refreshWith(first), refreshWith(first)]);
    const cookies = answers.map(({ headers }) => refreshCookie(headers['set-cookie']));
    expect(new Set(cookies).size).toBe(2);
    // The browser keeps whichever answer came last.
    for (const cookie of cookies) await refreshWith(cookie).expect(200);
  });

  it('ends the session for everybody when it is used again later: it was copied', async () => {
    const first = await signInForTokens();
    const answer = await refreshWith(first).expect(200);
    const second = refreshCookie(answer.headers['set-cookie']);
    later(2 * MINUTE_MS);
    expect((await refreshWith(first).expect(401)).body.reason).toBe('sessionEnded');
    expect((await refreshWith(second).expect(401)).body.reason).toBe('sessionEnded');
  });

  it('is worth nothing after 30 days', async () => {
    const first = await signInForTokens();
    later(31 * 24 * 60 * MINUTE_MS);
    await refreshWith(first).expect(401);
  });

  it.each(['lampwright-refresh=nonsense', 'lampwright-refresh=a.b.c', 'lampwright-refresh=x.y'])(
    'is not %s',
    async (cookie) => {
      expect((await refreshWith(cookie).expect(401)).body.reason).toBe('sessionEnded');
    },
  );

  it('must be there', async () => {
    const { body } = await server.client().post('/api/auth/refresh').expect(401);
    expect(body.reason).toBe('notSignedIn');
  });
});

describe('a session', () => {
  it('is refused at once after signing out, though its access token is not old', async () => {
    const agent = await server.signedIn(TECHNICIAN);
    const signedIn = await agent.post('/api/auth/refresh').expect(200);
    const cookies = (signedIn.headers['set-cookie'] as unknown as string[]).map(
      (cookie) => cookie.split(';')[0],
    );
    await agent.post('/api/auth/sign-out').expect(204);
    await agent.get('/api/auth/account').expect(401);
    const { body } = await server
      .client()
      .get('/api/auth/account')
      .set('Cookie', cookies.join('; '))
      .expect(401);
    expect(body.reason).toBe('sessionEnded');
  });

  it('shows up by its device, and can be ended from another', async () => {
    const here = await server.signedIn(TECHNICIAN);
    const there = server.client();
    await there
      .post('/api/auth/sign-in')
      .send({ email: TECHNICIAN, password: 'thornwick-demo', deviceName: 'Tablet 4' })
      .expect(200);

    const { body: sessions } = await here.get('/api/auth/account/sessions').expect(200);
    expect(sessions).toHaveLength(2);
    const other = sessions.find(({ current }: { current: boolean }) => !current);
    expect(other.deviceName).toBe('Tablet 4');

    await here.delete(`/api/auth/account/sessions/${other.id}`).expect(204);
    expect((await there.get('/api/auth/account').expect(401)).body.reason).toBe('sessionEnded');
    await here.get('/api/auth/account').expect(200);
  });

  it("is nobody else's to end, unless a lead does", async () => {
    const technician = await server.signedIn(TECHNICIAN);
    const lead = await server.signedIn(LEAD);
    const id = personId(TECHNICIAN);
    const { body: mine } = await lead.get('/api/auth/account/sessions');
    await technician.delete(`/api/auth/account/sessions/${mine[0].id}`).expect(404);

    const { body: theirs } = await lead.get(`/api/people/${id}/sessions`).expect(200);
    await lead.delete(`/api/people/${id}/sessions/${theirs[0].id}`).expect(204);
    await technician.get('/api/auth/account').expect(401);
  });

  it('is refused with a forged or foreign token', async () => {
    for (const cookie of ['lampwright=x.y.z', 'lampwright=']) {
      const { body } = await server
        .client()
        .get('/api/auth/account')
        .set('Cookie', cookie)
        .expect(401);
      expect(body.reason).toBe('notSignedIn');
    }
  });
});

describe('a closed account', () => {
  it('is refused at once, in its running session and at the next sign-in', async () => {
    const technician = await server.signedIn(TECHNICIAN);
    const lead = await server.signedIn(LEAD);
    await lead.post(`/api/people/${personId(TECHNICIAN)}/close`).expect(200);

    const running = await technician.get('/api/auth/account').expect(401);
    expect(running.body.reason).toBe('accountClosed');
    const refreshed = await technician.post('/api/auth/refresh').expect(401);
    expect(refreshed.body.reason).toBe('accountClosed');
    const next = await server
      .client()
      .post('/api/auth/sign-in')
      .send({ email: TECHNICIAN, password: 'thornwick-demo' })
      .expect(401);
    expect(next.body.reason).toBe('accountClosed');
    const guessed = await server
      .client()
      .post('/api/auth/sign-in')
      .send({ email: TECHNICIAN, password: 'a guess' })
      .expect(401);
    expect(guessed.body.reason).toBe('signInFailed');
  });
});
