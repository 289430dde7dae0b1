import { verify } from '@node-rs/argon2';
import { EntityManager } from '@mikro-orm/better-sqlite';
import {
  LEAD,
  personId,
  startTestServer,
  TECHNICIAN,
  type TestServer,
} from '../testing/test-server';
import { DEMO_PASSWORD } from '../demo/demo-password';
import { Person } from '../people/person.entity';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const signIn = (body: object) => server.client().post('/api/auth/sign-in').send(body);

describe('signing in', () => {
  it('answers with the account and what its role permits', async () => {
    const { body } = await signIn({ email: LEAD, password: DEMO_PASSWORD }).expect(200);
    expect(body).toMatchObject({
      id: personId(LEAD),
      role: 'lead',
      preferences: { lengths: 'feet', theme: 'system' },
    });
    expect(body.permissions).toContain('people.write');
    expect(body).not.toHaveProperty('passwordHash');
  });

  it('takes the e-mail address in any case', async () => {
    await signIn({ email: LEAD.toUpperCase(), password: DEMO_PASSWORD }).expect(200);
  });

  it('remembers when', async () => {
    const before = Date.now();
    const { body } = await signIn({ email: LEAD, password: DEMO_PASSWORD });
    expect(Date.parse(body.lastSignInAt)).toBeGreaterThanOrEqual(before);
  });

  it('says the same of a wrong password and of an unknown address', async () => {
    const wrong = await signIn({ email: TECHNICIAN, password: 'not the password' }).expect(401);
    const unknown = await signIn({ email: 'nobody@yard.example', password: 'x' }).expect(401);
    expect(wrong.body.reason).toBe('signInFailed');
    expect({ ...unknown.body, requestId: '' }).toEqual({ ...wrong.body, requestId: '' });
    expect(wrong.headers['set-cookie']).toBeUndefined();
  });

  it('names every field that is wrong', async () => {
    const { body } = await signIn({ email: 'no address', extra: 1 }).expect(400);
    expect(body.reason).toBe('validation');
    const paths = body.errors.map(({ path }: { path: string }) => path);
    expect(new Set(paths)).toEqual(new Set(['email', 'password', 'extra']));
  });

  it.each([[{ email: { $ne: '' }, password: 'x' }], [{ email: LEAD, password: ['x'] }], [[]]])(
    'does not take %j for text',
    async (body) => {
      expect((await signIn(body).expect(400)).body.reason).toBe('validation');
    },
  );
});

describe('the cookies', () => {
  const cookiesOf = async (on: TestServer) => {
    const response = await on
      .client()
      .post('/api/auth/sign-in')
      .send({ email: LEAD, password: DEMO_PASSWORD });
    return response.headers['set-cookie'] as unknown as string[];
  };

  it('are closed to scripts and to other sites, and the refresh token goes to its routes alone', async () => {
    const [access, refresh] = await cookiesOf(server);
    expect(access).toMatch(/^lampwright=.*Max-Age=900; Path=\/;.*HttpOnly; SameSite=Strict$/);
    expect(refresh).toMatch(
      /^lampwright-refresh=.*Max-Age=2592000; Path=\/api\/auth;.*HttpOnly; SameSite=Strict$/,
    );
  });

  it('are bound to HTTPS where browsers use it', async () => {
    const secure = await startTestServer({ https: true });
    const [access, refresh] = await cookiesOf(secure);
    expect(access).toMatch(/^__Host-lampwright=.*Path=\/;.*HttpOnly; Secure; SameSite=Strict$/);
    expect(refresh).toMatch(/^__Secure-lampwright-refresh=.*HttpOnly; Secure; SameSite=Strict$/);
    await secure.close();
  });
});

it('stores passwords as argon2id with the recommended cost', async () => {
  const em = server.app.get(EntityManager).fork();
  const person = await em.findOneOrFail(Person, personId(LEAD), { populate: ['passwordHash'] });
  expect(person.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  expect(await verify(person.passwordHash, DEMO_PASSWORD)).toBe(true);
});
