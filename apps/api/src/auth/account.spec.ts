import { startTestServer, TECHNICIAN, type TestServer } from '../testing/test-server';

let server: TestServer;
beforeEach(async () => {
  server = await startTestServer();
});
afterEach(() => server.close());

describe('the own account', () => {
  it('changes what is given and keeps the rest', async () => {
    const agent = await server.signedIn(TECHNICIAN);
    await agent
      .patch('/api/auth/account')
      .send({ preferences: { theme: 'dark' } })
      .expect(200);
    await agent.patch('/api/auth/account').send({ name: ' Ruben A. ' }).expect(200);
    const { body } = await agent.get('/api/auth/account').expect(200);
    expect(body).toMatchObject({
      name: 'Ruben A.',
      preferences: { lengths: 'feet', theme: 'dark' },
    });
  });

  it('names a preference that does not exist', async () => {
    const agent = await server.signedIn(TECHNICIAN);
    const { body } = await agent
      .patch('/api/auth/account')
      .send({ preferences: { theme: 'plaid', sound: 1 } })
      .expect(400);
    const paths = body.errors.map(({ path }: { path: string }) => path);
    expect(paths).toEqual(expect.arrayContaining(['preferences.theme', 'preferences.sound']));
  });

  it('does not let anybody raise the own role', async () => {
    const agent = await server.signedIn(TECHNICIAN);
    await agent.patch('/api/auth/account').send({ role: 'lead' }).expect(400);
  });
});

describe('a new password', () => {
  const change = { current: 'thornwick-demo', next: 'a longer password' };

  it('replaces the old one and signs all other devices out', async () => {
    const here = await server.signedIn(TECHNICIAN);
    const there = await server.signedIn(TECHNICIAN);
    await here.post('/api/auth/account/password').send(change).expect(204);
    await here.get('/api/auth/account').expect(200);
    await there.get('/api/auth/account').expect(401);

    const signIn = (password: string) =>
      server.client().post('/api/auth/sign-in').send({ email: TECHNICIAN, password });
    await signIn(change.current).expect(401);
    await signIn(change.next).expect(200);
  });

  it('needs the old one', async () => {
    const agent = await server.signedIn(TECHNICIAN);
    const { body } = await agent
      .post('/api/auth/account/password')
      .send({ ...change, current: 'wrong' })
      .expect(400);
    expect(body.errors).toMatchObject([{ path: 'current', code: 'wrongPassword' }]);
  });

  it('has ten characters at least', async () => {
    const agent = await server.signedIn(TECHNICIAN);
    const { body } = await agent
      .post('/api/auth/account/password')
      .send({ ...change, next: 'short' })
      .expect(400);
    expect(body.errors).toMatchObject([{ path: 'next', code: 'minLength' }]);
  });
});
