import { demoYard } from '@lampwright/demo';
import {
  LEAD,
  personId,
  startTestServer,
  TECHNICIAN,
  trailerId,
  TRAINEE,
  type Agent,
  type TestServer,
} from '../testing/test-server';

let server: TestServer;
let lead: Agent;
const open = '11111111-1111-4111-8111-111111111111';
beforeAll(async () => {
  server = await startTestServer({ demo: 'full' });
  lead = await server.signedIn(LEAD);
  await lead
    .post('/api/traces')
    .send({ id: open, trailerId: trailerId('P-031') })
    .expect(201);
}, 60_000);
afterAll(() => server.close());

interface Item {
  id: string;
  trailer: { unit: string };
  author: { name: string };
  openedAt: string;
  powerUps: number;
}
async function list(query: string, agent = lead): Promise<Item[]> {
  return (await agent.get(`/api/traces?${query}`).expect(200)).body.items;
}
const finished = demoYard.finishedTraces;

it('begins with the newest, and gives what a list shows', async () => {
  const items = await list('');
  expect(items).toHaveLength(finished.length + 1);
  expect(items[0]!.id).toBe(open);
  expect(items.slice(1).map(({ id }) => id)).toEqual(finished.map(({ id }) => id).reverse());
  expect(items[1]).toMatchObject({
    step: 'signed',
    circuits: ['right'],
    found: expect.any(String),
  });
  expect(items[1]!.powerUps).toBeGreaterThan(0);
});

it('is filtered by state, step, trailer, author and circuit', async () => {
  expect(await list('state=open')).toMatchObject([{ id: open }]);
  expect(await list('state=signed')).toHaveLength(finished.length);
  expect(await list('state=abandoned')).toEqual([]);
  expect(await list('step=intake')).toMatchObject([{ id: open }]);
  expect(await list(`trailerId=${trailerId('P-031')}`)).toHaveLength(2);
  const author = personId(TECHNICIAN);
  const authored = finished.filter(({ authorId }) => authorId === author);
  expect(await list(`authorId=${author}`)).toHaveLength(authored.length);
  const onTail = finished.filter(({ circuits }) => circuits.includes('tail')).map(({ id }) => id);
  expect((await list('circuit=tail')).map(({ id }) => id).sort()).toEqual(onTail.sort());
  expect(await list(`circuit=tail&authorId=${author}`)).toHaveLength(
    authored.filter(({ circuits }) => circuits.includes('tail')).length,
  );
});

it('shows all circuits of a trace that it found by one', async () => {
  const items = (await list('circuit=abs')) as unknown as { circuits: string[] }[];
  expect(items).toMatchObject([{ circuits: ['abs'] }]);
});

it('is searched by unit, person, complaint and place', async () => {
  expect((await list('search=H-559')).map(({ trailer }) => trailer.unit)).toEqual(['H-559']);
  expect(await list('search=askeland')).toHaveLength(
    finished.filter(({ authorId }) => authorId === personId(TECHNICIAN)).length,
  );
  expect(await list('search=slider')).toHaveLength(1);
  expect(await list('search=tracker')).toHaveLength(1);
});

it.each(['openedAt', 'signedAt', 'step', 'powerUps', 'complaint', 'found', 'trailer', 'author'])(
  'is sorted by %s, both ways, and paged without overlap',
  async (sort) => {
    const all = (await list(`sort=${sort}&size=100`)).map(({ id }) => id);
    const reversed = (await list(`sort=-${sort}&size=100`)).map(({ id }) => id);
    expect(reversed).toEqual([...all].reverse());
    const pages = [
      ...(await list(`sort=${sort}&size=3&page=1`)),
      ...(await list(`sort=${sort}&size=3&page=2`)),
      ...(await list(`sort=${sort}&size=3&page=3`)),
    ];
    expect(pages.map(({ id }) => id)).toEqual(all);
  },
);

it('sorts by what it says', async () => {
  const units = (await list('sort=trailer')).map(({ trailer }) => trailer.unit);
  expect(units).toEqual([...units].sort());
  const powerUps = (await list('sort=-powerUps')).map((item) => item.powerUps);
  expect(powerUps).toEqual([...powerUps].sort((a, b) => b - a));
});

it('shows a trainee the own ones alone, and says of others that there are none', async () => {
  const trainee = await server.signedIn(TRAINEE);
  expect(await list('', trainee)).toEqual([]);
  expect(await list(`authorId=${personId(TECHNICIAN)}`, trainee)).toEqual([]);
  await trainee.get(`/api/traces/${finished[0]!.id}`).expect(404);
});

it('gives a finished trace with its whole record, no longer writable', async () => {
  const { body } = await lead.get(`/api/traces/${finished[0]!.id}`).expect(200);
  expect(body).toMatchObject({ step: 'signed', writable: false });
  expect(body.record.events.at(-1).type).toBe('trace.signed');
  await lead.get('/api/traces/none').expect(404);
});
