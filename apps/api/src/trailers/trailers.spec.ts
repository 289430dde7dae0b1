import { demoYard } from '@lampwright/demo';
import {
  startTestServer,
  TECHNICIAN,
  TRAINEE,
  trailerId,
  type Agent,
  type TestServer,
} from '../testing/test-server';

let server: TestServer;
let technician: Agent;
beforeEach(async () => {
  server = await startTestServer();
  technician = await server.signedIn(TECHNICIAN);
});
afterEach(() => server.close());

const newTrailer = {
  unit: 'N-001',
  bodyType: 'flatbed',
  lengthMetres: 14.6,
  widthMetres: 2.6,
  year: 2020,
  fleet: 'Quillmoor Freight',
  secondSources: ['battery'],
  abs: true,
};
const units = ({ body }: { body: { items: { unit: string }[] } }) =>
  body.items.map(({ unit }) => unit);

describe('the list of trailers', () => {
  it('is sorted by unit number, with plans and without open traces', async () => {
    const answer = await technician.get('/api/trailers').expect(200);
    expect(units(answer)).toEqual(demoYard.trailers.map(({ unit }) => unit).sort());
    expect(answer.body.items[0]).toMatchObject({ plan: { revision: 1 }, openTraceId: null });
  });

  it('is searched by unit, fleet and plate, and filtered by body', async () => {
    expect(units(await technician.get('/api/trailers?search=t-118'))).toEqual(['T-118']);
    expect(units(await technician.get('/api/trailers?search=6640'))).toEqual(['H-559']);
    expect(units(await technician.get('/api/trailers?search=saltmarsh'))).toEqual([
      'K-303',
      'U-016',
    ]);
    expect(units(await technician.get('/api/trailers?bodyType=tank'))).toEqual(['K-303']);
  });

  it('is paged without overlap', async () => {
    const pages = await Promise.all(
      [1, 2, 3].map((page) => technician.get(`/api/trailers?sort=fleet&size=3&page=${page}`)),
    );
    expect(new Set(pages.flatMap(units)).size).toBe(demoYard.trailers.length);
    expect(pages[0]!.body.total).toBe(demoYard.trailers.length);
  });

  it('is sorted downwards', async () => {
    const answer = await technician.get('/api/trailers?sort=-year&size=1');
    expect(units(answer)).toEqual(['T-118']);
  });
});

describe('a trailer', () => {
  it('is added and read back', async () => {
    const planId = demoYard.plans[0]!.id;
    const { body } = await technician
      .post('/api/trailers')
      .send({ ...newTrailer, planId })
      .expect(201);
    expect(body).toMatchObject({
      ...newTrailer,
      notes: '',
      plate: null,
      plan: { id: planId },
      version: 1,
    });
    expect((await technician.get(`/api/trailers/${body.id}`).expect(200)).body).toEqual(body);
  });

  it('has a unit number of its own', async () => {
    const { body } = await technician
      .post('/api/trailers')
      .send({ ...newTrailer, unit: ' T-118 ' })
      .expect(409);
    expect(body.errors).toMatchObject([{ path: 'unit', code: 'unitTaken' }]);
  });

  it('is not taken with fields that make no sense', async () => {
    const { body } = await technician
      .post('/api/trailers')
      .send({
        ...newTrailer,
        lengthMetres: -1,
        year: 1.5,
        bodyType: 'boat',
        secondSources: ['sun'],
        planId: 'none',
      })
      .expect(400);
    const paths = new Set(body.errors.map(({ path }: { path: string }) => path));
    expect(paths).toEqual(new Set(['lengthMetres', 'year', 'bodyType', 'secondSources']));
    const unknown = await technician.post('/api/trailers').send({ ...newTrailer, planId: 'none' });
    expect(unknown.body.errors).toMatchObject([{ path: 'planId', code: 'unknownPlan' }]);
  });

  it('changes where something is given, and loses its plan when told to', async () => {
    const id = trailerId('T-118');
    const { body } = await technician
      .patch(`/api/trailers/${id}`)
      .send({ notes: 'New lamps' })
      .expect(200);
    expect(body).toMatchObject({ notes: 'New lamps', unit: 'T-118', version: 2 });
    expect(body.plan).not.toBeNull();
    const without = await technician
      .patch(`/api/trailers/${id}`)
      .send({ planId: null })
      .expect(200);
    expect(without.body.plan).toBeNull();
  });

  it('may not lose what it must have', async () => {
    const { body } = await technician
      .patch(`/api/trailers/${trailerId('T-118')}`)
      .send({ unit: null, abs: null })
      .expect(400);
    const paths = new Set(body.errors.map(({ path }: { path: string }) => path));
    expect(paths).toEqual(new Set(['unit', 'abs']));
  });

  it('is not overwritten by somebody who read it before another changed it', async () => {
    const path = `/api/trailers/${trailerId('T-118')}`;
    await technician.patch(path).send({ notes: 'first', version: 1 }).expect(200);
    const { body } = await technician.patch(path).send({ notes: 'second', version: 1 }).expect(409);
    expect(body.errors).toMatchObject([{ path: 'version', code: 'staleVersion' }]);
    expect((await technician.get(path)).body.notes).toBe('first');
  });

  it('is not found, not even to change it', async () => {
    await technician.get('/api/trailers/none').expect(404);
    await technician.patch('/api/trailers/none').send({ notes: '' }).expect(404);
  });

  it('is not for a trainee to change', async () => {
    const trainee = await server.signedIn(TRAINEE);
    await trainee.post('/api/trailers').send(newTrailer).expect(403);
    await trainee.get('/api/trailers').expect(200);
  });
});
