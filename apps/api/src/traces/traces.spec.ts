import { randomUUID } from 'node:crypto';
import { cautionsLeft, contextOf, openTrace, type TraceEvent } from '@lampwright/trace';
import { demoYard } from '@lampwright/demo';
import {
  LEAD,
  OTHER_TECHNICIAN,
  personId,
  startTestServer,
  TECHNICIAN,
  trailerId,
  TRAINEE,
  type Agent,
  type TestServer,
} from '../testing/test-server';
import { Tablet } from '../testing/tablet';

let server: TestServer;
let technician: Agent;
beforeAll(async () => {
  server = await startTestServer();
  technician = await server.signedIn(TECHNICIAN);
});
afterAll(() => server.close());

/** Opens a trace on the dry van; gives its id. */
async function open(agent = technician, unit = 'T-118'): Promise<string> {
  const id = randomUUID();
  await agent
    .post('/api/traces')
    .send({ id, trailerId: trailerId(unit) })
    .expect(201);
  return id;
}
const tablet = () => new Tablet(personId(TECHNICIAN));
const send = (id: string, events: unknown, agent = technician) =>
  agent.post(`/api/traces/${id}/events`).send({ events });
const outcomes = ({ body }: { body: { results: { outcome: string }[] } }) =>
  body.results.map(({ outcome }) => outcome);
const stored = async (id: string): Promise<TraceEvent[]> =>
  (await technician.get(`/api/traces/${id}`).expect(200)).body.record.events;

describe('opening a trace', () => {
  it('keeps the trailer, the plan and the settings as they stand', async () => {
    const id = await open();
    const trailer = `/api/trailers/${trailerId('T-118')}`;
    await technician.patch(trailer).send({ unit: 'T-119' }).expect(200);
    const { body } = await technician.get(`/api/traces/${id}`).expect(200);
    await technician.patch(trailer).send({ unit: 'T-118' }).expect(200);
    expect(body).toMatchObject({
      id,
      step: 'intake',
      trailer: { unit: 'T-118' },
      author: { id: personId(TECHNICIAN), name: 'Ruben Askeland' },
      circuits: [],
      powerUps: 0,
      signedAt: null,
      found: null,
      writable: true,
      record: { id, trailer: { unit: 'T-118' }, plan: { revision: 1 }, events: [] },
    });
    expect(body.record.plan.harness).toEqual(demoYard.plans[0]!.harness);
  });

  it('shows on the trailer', async () => {
    const id = await open();
    const { body } = await technician.get(`/api/trailers/${trailerId('T-118')}`);
    expect(body.openTraceId).toBe(id);
  });

  it('twice with one id is answered in the same way, and opens one', async () => {
    const request = { id: randomUUID(), trailerId: trailerId('P-031') };
    const both = await Promise.all([
      technician.post('/api/traces').send(request),
      technician.post('/api/traces').send(request),
    ]);
    expect(both.map(({ status }) => status)).toEqual([201, 201]);
    expect(both[0]!.body).toEqual(both[1]!.body);
    const { body } = await technician.get(`/api/traces?trailerId=${request.trailerId}`);
    expect(body.total).toBe(1);
  });

  it('with the id of a trace on another trailer, or of another person, is a conflict', async () => {
    const id = await open();
    const other = await technician
      .post('/api/traces')
      .send({ id, trailerId: trailerId('F-204') })
      .expect(409);
    expect(other.body.reason).toBe('conflict');
    const ines = await server.signedIn(OTHER_TECHNICIAN);
    await ines
      .post('/api/traces')
      .send({ id, trailerId: trailerId('T-118') })
      .expect(409);
  });

  it('is refused on a tank trailer, on one without a plan, and on none', async () => {
    const attempt = (trailer: string) =>
      technician.post('/api/traces').send({ id: randomUUID(), trailerId: trailer });
    expect((await attempt(trailerId('K-303')).expect(422)).body.reason).toBe('tankTrailer');
    await technician.patch(`/api/trailers/${trailerId('U-016')}`).send({ planId: null });
    expect((await attempt(trailerId('U-016')).expect(422)).body.reason).toBe('noPlan');
    await attempt('none').expect(404);
    await technician.post('/api/traces').send({ id: 'x', trailerId: 'none' }).expect(400);
  });

  it('is not for trainees', async () => {
    const trainee = await server.signedIn(TRAINEE);
    await trainee
      .post('/api/traces')
      .send({ id: randomUUID(), trailerId: trailerId('T-118') })
      .expect(403);
  });
});

describe('a batch of events', () => {
  it('is stored as sent, and moves the trace on', async () => {
    const id = await open();
    const events = [tablet().intake('tail')];
    const answer = await send(id, events).expect(200);
    expect(answer.body).toEqual({
      results: [{ id: events[0]!.id, outcome: 'accepted' }],
      step: 'makeSafe',
    });
    expect(await stored(id)).toEqual(events);
    const { body } = await technician.get(`/api/traces/${id}`);
    expect(body).toMatchObject({
      step: 'makeSafe',
      complaint: 'Lamps go out',
      circuits: ['tail'],
      circuitNames: ['Tail, marker and identification'],
    });
  });

  it('sent twice, and half of it once more, is stored once', async () => {
    const id = await open();
    const person = tablet();
    const events = [person.intake('tail'), ...(await ticks(id, person))];
    expect(outcomes(await send(id, events))).toEqual(events.map(() => 'accepted'));
    expect(outcomes(await send(id, events))).toEqual(events.map(() => 'duplicate'));
    const half = events.slice(0, 2);
    const next = person.says({ type: 'safety.confirmed' });
    expect(outcomes(await send(id, [...half, next]))).toEqual([
      'duplicate',
      'duplicate',
      'accepted',
    ]);
    expect(await stored(id)).toEqual([...events, next]);
  });

  it('sent twice at the same moment is stored once', async () => {
    const id = await open();
    const events = [tablet().intake('tail')];
    const answers = await Promise.all([send(id, events), send(id, events)]);
    expect(answers.flatMap(outcomes).sort()).toEqual(['accepted', 'duplicate']);
    expect(await stored(id)).toHaveLength(1);
  });

  it('with one that the machine refuses stores what came before, and nothing after', async () => {
    const id = await open();
    const person = tablet();
    const intake = person.intake('tail');
    const early = person.says({ type: 'safety.confirmed' });
    const after = person.says({ type: 'caution.ticked', caution: 'chocks' });
    const { body } = await send(id, [intake, early, after]).expect(200);
    expect(body.results).toMatchObject([
      { outcome: 'accepted' },
      { outcome: 'refused', refusal: { reason: 'cautionsLeft' } },
      { outcome: 'refused', refusal: { reason: 'outOfSequence' } },
    ]);
    expect(body.step).toBe('makeSafe');
    expect(await stored(id)).toEqual([intake]);
  });

  it.each([
    ['of an unknown type', { type: 'trailer.painted' }],
    ['without its data', { type: 'intake.stated' }],
    [
      'with data of the wrong kind',
      { type: 'intake.stated', complaint: 1, circuits: 'tail', feed: 0 },
    ],
    ['with data that it does not have', { type: 'nothing.found', more: true }],
  ])('refuses an event %s by itself', async (_what, body) => {
    const id = await open();
    const event = tablet().says(body as never);
    const answer = await send(id, [event]).expect(200);
    expect(answer.body.results).toMatchObject([
      { id: event.id, outcome: 'refused', refusal: { reason: 'malformed' } },
    ]);
    expect(await stored(id)).toEqual([]);
  });

  it('refuses an id that is known with other content, here or in another trace', async () => {
    const first = await open();
    const second = await open(technician, 'F-204');
    const event = tablet().intake('tail');
    await send(first, [event]).expect(200);
    const changed = await send(first, [{ ...event, complaint: 'Another' }]).expect(200);
    expect(changed.body.results[0]).toMatchObject({
      outcome: 'refused',
      refusal: { reason: 'malformed' },
    });
    const elsewhere = await send(second, [event]).expect(200);
    expect(outcomes(elsewhere)).toEqual(['refused']);
    expect(await stored(first)).toEqual([event]);
    expect(await stored(second)).toEqual([]);
  });

  it('refuses a gap in the numbers of a device', async () => {
    const id = await open();
    const { body } = await send(id, [{ ...tablet().intake('tail'), seq: 2 }]).expect(200);
    expect(body.results[0].refusal.reason).toBe('outOfSequence');
  });

  it('takes back the newest event, and keeps both on record', async () => {
    const id = await open(technician, 'R-412');
    const onTrailer = `/api/traces?trailerId=${trailerId('R-412')}`;
    const person = tablet();
    const intake = person.intake('tail');
    const undo = person.says({ type: 'event.undone', target: intake.id });
    const again = person.intake('stop', 'left');
    const { body } = await send(id, [intake, undo]).expect(200);
    expect(body.step).toBe('intake');
    expect((await technician.get(`/api/traces/${id}`)).body.circuits).toEqual([]);
    await send(id, [again]).expect(200);
    expect((await technician.get(`/api/traces/${id}`)).body.circuits).toEqual(['stop', 'left']);
    expect(await stored(id)).toHaveLength(3);
    expect((await technician.get(`${onTrailer}&circuit=tail`)).body.total).toBe(0);
    expect((await technician.get(`${onTrailer}&circuit=left`)).body.total).toBe(1);
  });

  it('goes on from another tablet and another technician', async () => {
    const id = await open();
    await send(id, [tablet().intake('tail')]).expect(200);
    const ines = await server.signedIn(OTHER_TECHNICIAN);
    const tick = new Tablet(personId(OTHER_TECHNICIAN), 'tablet-2').says({
      type: 'caution.ticked',
      caution: 'shopProcedure',
    });
    expect(outcomes(await send(id, [tick], ines).expect(200))).toEqual(['accepted']);
    expect((await stored(id)).map(({ by }) => by)).toEqual([
      personId(TECHNICIAN),
      personId(OTHER_TECHNICIAN),
    ]);
  });

  it('in the name of somebody else is refused as a whole', async () => {
    const id = await open();
    const events = [tablet().intake('tail'), new Tablet(personId(LEAD)).intake('tail')];
    const { body } = await send(id, events).expect(403);
    expect(body).toMatchObject({ reason: 'notAllowed', errors: [{ path: 'events[1].by' }] });
    expect(await stored(id)).toEqual([]);
  });

  it('must have envelopes, and between 1 and 100 of them', async () => {
    const id = await open();
    const event = tablet().intake('tail');
    const { body } = await send(id, [{ ...event, id: 'x', seq: 0, at: 'noon' }]).expect(400);
    const paths = body.errors.map(({ path }: { path: string }) => path);
    expect(paths).toEqual(
      expect.arrayContaining(['events[0].id', 'events[0].seq', 'events[0].at']),
    );
    for (const events of [[], 'none', null, [null], [[]], ['x'], Array(101).fill(event)]) {
      expect((await send(id, events).expect(400)).body.reason).toBe('validation');
    }
  });

  it('has a trace to belong to', async () => {
    await send(randomUUID(), [tablet().intake('tail')]).expect(404);
  });
});

/** The ticks of all cautions that the trace asks for after an intake. */
async function ticks(id: string, person: Tablet): Promise<TraceEvent[]> {
  const { body } = await technician.get(`/api/traces/${id}`);
  const log = openTrace({ ...body.record, events: [person.last!] });
  return cautionsLeft(contextOf(log)).map((caution) =>
    person.says({ type: 'caution.ticked', caution }),
  );
}
