import { placesOnCircuit } from '@lampwright/harness';
import { foldTrace } from './traceLog';
import { stepOf } from './selectors/stepOf';
import { lineHarness, newRecord, truthfulTester } from './testing';

const places = placesOnCircuit(lineHarness, 'tail').map(({ ref }) => ref);

describe('a played trace', () => {
  it.each(places)('finds and repairs a short at $kind $id $half', (place) => {
    const record = newRecord();
    const log = foldTrace({ ...record, events: truthfulTester(record, [place]) });
    expect(log.skipped).toEqual([]);
    expect(stepOf(log)).toBe('signed');
    expect(log.snapshot.context.repairs.map((repair) => repair.place)).toEqual([place]);
  });

  it('finds every pair of shorts', () => {
    for (const first of places) {
      for (const second of places) {
        if (first === second) continue;
        const record = newRecord();
        const log = foldTrace({ ...record, events: truthfulTester(record, [first, second]) });
        expect(stepOf(log)).toBe('signed');
        expect(log.snapshot.context.repairs.map((repair) => repair.place.id).sort()).toEqual(
          [first.id, second.id].sort(),
        );
      }
    }
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
    },
  );

  it('says that nothing was found where nothing is hidden', () => {
    const record = newRecord();
    const log = foldTrace({ ...record, events: truthfulTester(record, []) });
    expect(log.snapshot.context.signature?.cause).toBe('Nothing found.');
    expect(log.snapshot.context.repairs).toEqual([]);
  });
});
