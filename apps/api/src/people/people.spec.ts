import {
  LEAD,
  personId,
  startTestServer,
  TECHNICIAN,
  TRAINEE,
  type TestServer,
} from '../testing/test-server';

let server: TestServer;
beforeEach(async () => {
  server = await startTestServer();
});
afterEach(() => server.close());

const newcomer = {
  name: 'Ada Newcomb',
  email: 'Ada@thornwick-yard.example',
  role: 'technician',
  password: 'a good password',
};

describe('opening an account', () => {
  it('lets the newcomer sign in', async () => {
    const lead = await server.signedIn(LEAD);
    const { body } = await lead.post('/api/people').send(newcomer).expect(201);
    expect(body).toMatchObject({ name: newcomer.name, closed: false, lastSignInAt: null });
    await server
      .client()
      .post('/api/auth/sign-in')
      .send({ email: newcomer.email, password: newcomer.password })
      .expect(200);
  });

  it('refuses an e-mail address that is taken, in any case', async () => {
    const lead = await server.signedIn(LEAD);
    const { body } = await lead
      .post('/api/people')
      .send({ ...newcomer, email: TRAINEE.toUpperCase() })
      .expect(409);
    expect(body).toMatchObject({ reason: 'conflict', errors: [{ path: 'email' }] });
  });
});

describe('the list of people', () => {
  it('is paged, searched and sorted', async () => {
    const lead = await server.signedIn(LEAD);
    const page = await lead.get('/api/people?size=2&page=2&sort=-name').expect(200);
    expect(page.body).toMatchObject({ total: 5, page: 2, size: 2 });
    expect(page.body.items.map(({ name }: { name: string }) => name)).toEqual([
      'Joss Penhallow',
      'Ines Corbray',
    ]);
    const found = await lead.get('/api/people?search=askel').expect(200);
    expect(found.body.items).toHaveLength(1);
    const wild = await lead.get(`/api/people?search=${encodeURIComponent('%')}`).expect(200);
    expect(wild.body.items.length).toBe(5);
  });

  it('says what it can be sorted by', async () => {
    const lead = await server.signedIn(LEAD);
    for (const sort of ['passwordHash', '__proto__', '-constructor', '']) {
      const { body } = await lead.get('/api/people').query({ sort }).expect(400);
      expect(body.errors[0].params.allowed).toContain('name');
    }
  });
});

describe('leads', () => {
  it('cannot leave the yard without one', async () => {
    const lead = await server.signedIn(LEAD);
    const id = personId(LEAD);
    const closing = await lead.post(`/api/people/${id}/close`).expect(409);
    expect(closing.body.reason).toBe('lastLead');
    const demotion = await lead.patch(`/api/people/${id}`).send({ role: 'technician' }).expect(409);
    expect(demotion.body.reason).toBe('lastLead');
    await lead.get('/api/people').expect(200);
  });

  it('may step down once there is another, who must not be closed', async () => {
    const lead = await server.signedIn(LEAD);
    const other = personId(TECHNICIAN);
    await lead.patch(`/api/people/${other}`).send({ role: 'lead' }).expect(200);
    await lead.post(`/api/people/${other}/close`).expect(200);
    await lead
      .patch(`/api/people/${personId(LEAD)}`)
      .send({ role: 'trainee' })
      .expect(409);
    await lead.post(`/api/people/${other}/reopen`).expect(200);
    await lead
      .patch(`/api/people/${personId(LEAD)}`)
      .send({ role: 'trainee' })
      .expect(200);
    await lead.get('/api/people').expect(403);
  });

  it('both stepping down at once leave one', async () => {
    const lead = await server.signedIn(LEAD);
    const other = personId(TECHNICIAN);
    await lead.patch(`/api/people/${other}`).send({ role: 'lead' }).expect(200);
    const second = await server.signedIn(TECHNICIAN);
    const answers = await Promise.all([
      lead.patch(`/api/people/${personId(LEAD)}`).send({ role: 'trainee' }),
      second.patch(`/api/people/${other}`).send({ role: 'trainee' }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });
});

it('answers 404 for somebody who does not exist', async () => {
  const lead = await server.signedIn(LEAD);
  await lead.patch('/api/people/nobody').send({ name: 'X' }).expect(404);
  await lead.post('/api/people/nobody/close').expect(404);
  await lead.post('/api/people/nobody/reopen').expect(404);
  await lead.get('/api/people/nobody/sessions').expect(404);
  await lead.delete('/api/people/nobody/sessions/none').expect(404);
});
