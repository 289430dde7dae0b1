import { mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { demoTraces, demoYard } from '@lampwright/demo';
import { LEAD, startTestServer } from '../testing/test-server';
import { DEMO_PASSWORD } from './demo-password';
import { FirstStartService } from './first-start.service';

it('makes one lead, whose password is shown once, where there is to be no demo yard', async () => {
  const dataDir = mkdtempSync(join(tmpdir(), 'lampwright-'));
  const first = await startTestServer({ demo: 'none', dataDir });
  const { firstLead } = first.app.get(FirstStartService);
  const signIn = await first.client().post('/api/auth/sign-in').send(firstLead!).expect(200);
  expect(signIn.body.role).toBe('lead');
  const demo = await first.client().get('/api/demo').expect(200);
  expect(demo.body).toEqual({ people: [], password: '' });
  await first.app.close();

  const second = await startTestServer({ demo: 'full', dataDir });
  expect(second.app.get(FirstStartService).firstLead).toBeNull();
  await second.client().post('/api/auth/sign-in').send(firstLead!).expect(200);
  await second.close();
});

it('fills an empty database with the demo yard, once, and keeps its secret to itself', async () => {
  const dataDir = mkdtempSync(join(tmpdir(), 'lampwright-'));
  const first = await startTestServer({ demo: 'full', dataDir });
  await first.app.close();
  const secret = readFileSync(join(dataDir, 'secret'), 'utf8');
  expect(secret.length).toBeGreaterThanOrEqual(64);
  expect(statSync(join(dataDir, 'secret')).mode & 0o777).toBe(0o600);

  const second = await startTestServer({ demo: 'full', dataDir });
  const lead = await second.signedIn(LEAD);
  const total = async (path: string) => (await lead.get(path).expect(200)).body.total;
  expect(await total('/api/people')).toBe(demoYard.people.length);
  expect(await total('/api/trailers')).toBe(demoYard.trailers.length);
  expect(await total('/api/plans')).toBe(demoYard.plans.length);
  expect(await total('/api/traces?state=signed')).toBe(demoYard.finishedTraces.length);
  expect(readFileSync(join(dataDir, 'secret'), 'utf8')).toBe(secret);

  const [record] = demoTraces();
  const { body } = await lead.get(`/api/traces/${record!.id}`).expect(200);
  expect(body.record).toEqual(record);
  await second.close();
  rmSync(dataDir, { recursive: true, force: true });
}, 120_000);

it('names the demo accounts that anybody can use, and no others', async () => {
  const server = await startTestServer();
  const lead = await server.signedIn(LEAD);
  const demo = async () => (await server.client().get('/api/demo').expect(200)).body;
  const all = demoYard.people.map(({ name, email, role }) => ({ name, email, role }));
  expect(await demo()).toEqual({ people: all, password: DEMO_PASSWORD });
  await lead
    .post('/api/auth/account/password')
    .send({ current: DEMO_PASSWORD, next: 'not the demo one' })
    .expect(204);
  await lead.post(`/api/people/${demoYard.people[1]!.id}/close`).expect(200);
  expect((await demo()).people).toEqual(all.slice(2));
  await server.close();
});
