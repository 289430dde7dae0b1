import { demoYard } from '@lampwright/demo';
import { HARNESS_FORMAT, type Harness, type Part, type Run } from '@lampwright/harness';
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

const harness = demoYard.plans[0]!.harness;
const store = (document: unknown) => lead.post('/api/plans').send({ harness: document });

/** A plan of many lamps on one long line. */
function longPlan(lamps: number, where = ''): Harness {
  const parts: Part[] = [
    { id: 'inlet', kind: 'inlet', label: 'Inlet', at: { along: 0, across: 0 } },
  ];
  const runs: Run[] = [];
  for (let i = 0; i < lamps; i++) {
    parts.push({
      id: `lamp-${i}`,
      kind: 'lamp',
      label: `Lamp ${i}`,
      at: { along: i / 100, across: 1 },
      where,
      separable: { openSeconds: 10, closeSeconds: 10 },
      lamp: { loads: [{ circuit: 'tail', amps: 0.1 }], technology: 'led' },
    });
    runs.push({
      id: `run-${i}`,
      from: i === 0 ? 'inlet' : `lamp-${i - 1}`,
      to: `lamp-${i}`,
      circuits: ['tail'],
      metres: 0.01,
    });
  }
  return {
    format: HARNESS_FORMAT,
    name: `${lamps} lamps`,
    supply: { volts: 12, connector: 'SAE J560' },
    circuits: [{ id: 'tail', name: 'Tail' }],
    parts,
    runs,
  };
}

describe('a plan', () => {
  it('is stored as sent and read back', async () => {
    const { body } = await store(harness).expect(201);
    expect(body).toMatchObject({
      name: harness.name,
      revision: 1,
      parts: harness.parts.length,
      circuits: harness.circuits.length,
    });
    expect((await lead.get(`/api/plans/${body.id}`).expect(200)).body).toEqual(body);
    expect(body.harness).toEqual(harness);
  });

  it('gets revisions, and keeps the old ones', async () => {
    const { body: plan } = await store(harness);
    const { body: second } = await lead
      .post(`/api/plans/${plan.id}/revisions`)
      .send({ harness: { ...harness, name: 'Second' } })
      .expect(201);
    expect(second).toMatchObject({ id: plan.id, name: 'Second', revision: 2 });
    expect((await lead.get(`/api/plans/${plan.id}`)).body.revision).toBe(2);
    const first = await lead.get(`/api/plans/${plan.id}/revisions/1`).expect(200);
    expect(first.body.harness).toEqual(harness);
    await lead.get(`/api/plans/${plan.id}/revisions/3`).expect(404);
    await lead.get(`/api/plans/${plan.id}/revisions/x`).expect(400);
    const list = await lead.get('/api/plans?search=Second').expect(200);
    expect(list.body.items).toMatchObject([{ id: plan.id, revision: 2 }]);
  });

  it('revised by two people at once keeps both or says so', async () => {
    const { body: plan } = await store(harness);
    const revise = (name: string) =>
      lead.post(`/api/plans/${plan.id}/revisions`).send({ harness: { ...harness, name } });
    const answers = await Promise.all([revise('one'), revise('two')]);
    const stored = answers.filter(({ status }) => status === 201);
    const refused = answers.filter(({ status }) => status === 409);
    expect(stored.length + refused.length).toBe(2);
    expect(new Set(stored.map(({ body }) => body.revision)).size).toBe(stored.length);
    expect((await lead.get(`/api/plans/${plan.id}`)).body.revision).toBe(1 + stored.length);
  });

  it('with faults is refused with every fault by its path, and nothing is stored', async () => {
    const before = (await lead.get('/api/plans')).body.total;
    const broken = structuredClone(harness);
    broken.runs[0]!.from = 'nowhere';
    broken.parts[1]!.id = broken.parts[0]!.id;
    broken.runs[1]!.metres = -1;
    const { body } = await store(broken).expect(422);
    expect(body).toMatchObject({ reason: 'planFaults', status: 422 });
    const found = body.errors.map(
      ({ path, code }: { path: string; code: string }) => `${path} ${code}`,
    );
    expect(found).toEqual(
      expect.arrayContaining([
        'runs[0].from unknownReference',
        'parts[1].id duplicateId',
        'runs[1].metres negative',
      ]),
    );
    for (const { message } of body.errors) {
      expect(message).toMatch(/^[^{}]{10,}\.$/);
      expect(message).not.toMatch(/undefined|\[object/);
    }
    expect((await lead.get('/api/plans')).body.total).toBe(before);
  });

  it.each([
    [null, 'validation', 400],
    ['text', 'planFaults', 422],
    [[], 'planFaults', 422],
    [{ format: 'lampwright-harness/9' }, 'planFaults', 422],
    [{ format: HARNESS_FORMAT }, 'planFaults', 422],
  ])('is not %j', async (document, reason, status) => {
    expect((await store(document).expect(status)).body.reason).toBe(reason);
  });

  it('is named as missing', async () => {
    const { body } = await lead.post('/api/plans').send({}).expect(400);
    expect(body.errors[0].path).toBe('harness');
  });

  it('keeps keys that this program does not know', async () => {
    const { body } = await store({ ...harness, drawnBy: { name: 'A pen' } }).expect(201);
    expect((await lead.get(`/api/plans/${body.id}`)).body.harness.drawnBy).toEqual({
      name: 'A pen',
    });
  });

  it('may have ten thousand parts', async () => {
    const plan = longPlan(10_000);
    const { body } = await store(plan).expect(201);
    expect(body.parts).toBe(10_001);
    expect((await lead.get(`/api/plans/${body.id}`)).body.harness.runs).toHaveLength(10_000);
  });

  it('may have five megabytes', async () => {
    const plan = longPlan(3000, 'x'.repeat(1450));
    expect(JSON.stringify(plan).length).toBeGreaterThan(5_000_000);
    await store(plan).expect(201);
  });

  it('is published by leads alone, and read by all', async () => {
    const technician = await server.signedIn(TECHNICIAN);
    await technician.post('/api/plans').send({ harness }).expect(403);
    await technician.post('/api/plans/none/revisions').send({ harness }).expect(403);
    await technician.get('/api/plans').expect(200);
    await lead.post('/api/plans/none/revisions').send({ harness }).expect(404);
    await lead.get('/api/plans/none').expect(404);
  });
});
