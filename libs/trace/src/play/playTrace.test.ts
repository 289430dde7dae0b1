import { placeKey, placesOnCircuit } from '@lampwright/harness';
import { createPlanner } from '@lampwright/isolation';
import { foldTrace } from '../traceLog';
import { findings } from '../selectors/lists';
import { stepOf } from '../selectors/stepOf';
import { lineHarness, newRecord, truthfulTester } from '../testing';

const places = placesOnCircuit(lineHarness, 'tail').map(({ ref }) => ref);

/** Thinks less, so that many traces can be played. */
const choose = createPlanner({ steps: 50 });

describe('a played trace', () => {
  it.each(places)('finds and repairs a short at $kind $id $half', (place) => {
    const record = newRecord();
    const log = foldTrace({ ...record, events: truthfulTester(record, [place]) });
    expect(log.skipped).toEqual([]);
    expect(stepOf(log)).toBe('signed');
    expect(log.snapshot.context.repairs.map((repair) => repair.place)).toEqual([place]);
  });

  it.each([1, 4, 9])('finds two shorts, %i places apart', (apart) => {
    places.slice(apart).forEach((second, index) => {
      const hidden = [places[index]!, second];
      const record = newRecord();
      const log = foldTrace({ ...record, events: truthfulTester(record, hidden, { choose }) });
      expect(stepOf(log)).toBe('signed');
      const repaired = log.snapshot.context.repairs.map(({ place }) => placeKey(place));
      expect(repaired.sort()).toEqual(hidden.map(placeKey).sort());
    });
  });

  it.each(Array.from({ length: 60 }, (_, seed) => seed))(
    'comes to its end with a short that shows seven times in ten, seed %i',
    (seed) => {
      const record = newRecord();
      const place = places[seed % places.length]!;
      const events = truthfulTester(record, [place], { detection: 0.7, seed });
      const log = foldTrace({ ...record, events });
      expect(stepOf(log)).toBe('signed');
      expect(log.skipped).toEqual([]);
      // The planner never asks for a power-up that would be refused; looking early would be the way out.
      expect(events.map(({ type }) => type)).not.toContain('inspection.started');
    },
  );

  it.each(Array.from({ length: 20 }, (_, seed) => seed))(
    'comes to its end with two shorts that show eight times in ten, seed %i',
    (seed) => {
      const record = newRecord();
      const hidden = [places[seed % places.length]!, places[(seed + 5) % places.length]!];
      const events = truthfulTester(record, hidden, { detection: 0.8, seed, choose });
      expect(stepOf(foldTrace({ ...record, events }))).toBe('signed');
      expect(events.map(({ type }) => type)).not.toContain('inspection.started');
    },
  );

  it('says that nothing was found where nothing is hidden', () => {
    const record = newRecord();
    const log = foldTrace({ ...record, events: truthfulTester(record, []) });
    expect(log.snapshot.context.signature?.cause).toBe('Nothing found.');
    expect(log.snapshot.context.repairs).toEqual([]);
  });

  it('leaves a dark lamp as a finding and refuses to power a tank trailer', () => {
    const record = newRecord();
    const dark = [{ lamp: 'l1', note: 'Bulb on order' }];
    const log = foldTrace({ ...record, events: truthfulTester(record, [places[4]!], { dark }) });
    expect(findings(log.snapshot.context)).toEqual([
      { kind: 'lamp', circuit: 'tail', lamp: 'l1', result: 'dark' },
    ]);
    const tank = newRecord({ bodyType: 'tank' });
    expect(() => truthfulTester(tank, [places[4]!])).toThrow('tankTrailer');
  });

  it('is the same each time and differs from trace to trace', () => {
    const record = newRecord();
    const played = truthfulTester(record, [places[4]!]);
    expect(truthfulTester(record, [places[4]!])).toEqual(played);
    const other = truthfulTester({ ...record, id: 'another' }, [places[4]!]);
    const ids = new Set([...played, ...other].map(({ id }) => id));
    expect(ids.size).toBe(played.length + other.length);
  });
});
