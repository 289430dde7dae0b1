import { situation } from '../situation';
import { Teller } from '../testing';

const first = { kind: 'part', id: 'l1' } as const;

/** One short in lamp 1, found with its plug open, and another in the run behind plug 3. */
function oneRepaired(): Teller {
  const trace = new Teller().narrows().reads('holds', 'p1').reads('overload', 'p2');
  trace.reads('holds', 'p2', 'l1');
  expect(trace.step).toBe('inspect');
  trace.says({ type: 'place.inspected', place: first, method: 'swap', finding: 'found' });
  return trace.says({
    type: 'repair.made',
    place: first,
    cause: 'Crushed',
    correction: 'Lamp replaced',
    parts: [{ name: 'Lamp', quantity: 1 }],
  });
}

describe('two shorts', () => {
  it('asks for the repaired lamp to be connected before it is proven', () => {
    const trace = oneRepaired();
    const proof = { type: 'proof.read', circuit: 'tail', outcome: 'overload' } as const;
    expect(trace.refused(proof)).toEqual({ reason: 'repairNotEnergised', ids: ['l1'] });
  });

  it('hunts again when the proof overloads, and keeps what held cleared', () => {
    const trace = oneRepaired();
    trace.says(
      { type: 'point.reconnected', point: 'l1' },
      { type: 'point.reconnected', point: 'p2' },
      { type: 'proof.read', circuit: 'tail', outcome: 'overload' },
    );
    expect(trace.step).toBe('narrow');
    expect(trace.context).toMatchObject({ hunt: 2, found: null, inspected: [], proven: {} });
    const now = situation(trace.context)!;
    expect(now.belief.contradicted).toBe(false);
    expect(now.readings).toEqual([
      { open: ['p1'], outcome: 'holds' },
      { open: ['p2', 'l1'], outcome: 'holds' },
      { open: [], outcome: 'overload' },
    ]);
    expect(now.placesCleared).toContainEqual({ kind: 'run', id: 'p1-p2' });
    trace.reads('holds', 'p3', 'l2').reads('overload', 'l3', 'l2');
    expect(trace.step).toBe('inspect');
    const place = { kind: 'run', id: 'p3-l3' } as const;
    trace.says(
      { type: 'place.inspected', place, method: 'look', finding: 'found' },
      { type: 'repair.made', place, cause: 'Cut', correction: 'Replaced', parts: [] },
      { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
      { type: 'point.reconnected', point: 'l2' },
      { type: 'point.reconnected', point: 'l3' },
    );
    trace.finishes();
    expect(trace.step).toBe('signed');
    expect(trace.context.repairs).toHaveLength(2);
  });

  it('proves every circuit that showed the fault', () => {
    const trace = new Teller().narrows(['tail', 'stop']);
    expect(trace.context.circuit).toBe('tail');
    trace.says({ type: 'circuit.chosen', circuit: 'stop' });
    trace.reads('holds', 'p3');
    trace.says({ type: 'inspection.started' });
    const place = { kind: 'run', id: 'p3-l3' } as const;
    trace.says(
      { type: 'place.inspected', place, method: 'look', finding: 'found' },
      { type: 'repair.made', place, cause: 'Cut', correction: 'Replaced', parts: [] },
      { type: 'point.reconnected', point: 'p3' },
      { type: 'proof.read', circuit: 'stop', outcome: 'holds' },
    );
    expect(trace.step).toBe('prove');
    trace.says({ type: 'proof.read', circuit: 'tail', outcome: 'overload' });
    expect(trace.step).toBe('narrow');
    expect(trace.context).toMatchObject({ circuit: 'tail', hunt: 2 });
  });

  it('lets a person explain readings that one short cannot explain', () => {
    const trace = new Teller().narrows();
    // Lamp 1 overloads alone, and so does what lies behind plug 2 without lamp 1.
    trace.reads('overload', 'p2');
    trace.reads('overload', 'l1');
    expect(trace.context.contradiction).toBeNull();
    trace.reads('holds', 'l1', 'p2');
    expect(trace.context.contradiction).toBe('nothingLeft');
    trace.says({ type: 'contradiction.explained', meaning: 'secondShort' });
    expect(trace.context).toMatchObject({ contradiction: null, maxFaults: 2 });
    // Both hold a short for sure, so one of them is known.
    expect(trace.step).toBe('inspect');
  });
});
