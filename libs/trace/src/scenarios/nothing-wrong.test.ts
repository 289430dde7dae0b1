import { isAt } from '../selectors/stepOf';
import { findings } from '../selectors/lists';
import { Teller } from '../testing';

const quiet = () =>
  new Teller()
    .starts(['tail', 'stop'])
    .says(
      { type: 'circuit.confirmed', circuit: 'tail', outcome: 'holds', amps: 0.9 },
      { type: 'circuit.confirmed', circuit: 'stop', outcome: 'dark' },
      { type: 'confirm.finished' },
    );

describe('nothing wrong any more', () => {
  it('is said, and no fault is made up', () => {
    const trace = quiet();
    expect(trace.step).toBe('confirm');
    expect(isAt(trace.log, 'nothingWrong')).toBe(true);
    expect(trace.context.circuit).toBeNull();
    expect(
      trace.refused({ type: 'reading.taken', circuit: 'tail', open: ['p1'], outcome: 'holds' }),
    ).toEqual({ reason: 'notInThisStep', ids: ['reading.taken'] });
  });

  it('goes to the lamp check and is signed as nothing found, with the dark circuit on record', () => {
    const trace = quiet().says(
      { type: 'wiggle.read', circuit: 'tail', outcome: 'holds' },
      { type: 'nothing.found' },
    );
    expect(trace.step).toBe('lampCheck');
    trace.finishes();
    expect(trace.step).toBe('signed');
    expect(findings(trace.context)).toEqual([{ kind: 'darkCircuit', circuit: 'stop' }]);
  });

  it('narrows where moving the harness brings the fault back', () => {
    const trace = quiet().says({ type: 'wiggle.read', circuit: 'tail', outcome: 'overload' });
    expect(trace.step).toBe('narrow');
    expect(trace.context).toMatchObject({ circuit: 'tail', comesAndGoes: true });
    expect(
      trace.refused({ type: 'reading.taken', circuit: 'tail', open: [], outcome: 'holds' }),
    ).toEqual({ reason: 'unchangedState', ids: ['tail'] });
  });

  it('waits until every circuit of the complaint was powered, each once if it overloads', () => {
    const trace = new Teller().starts(['tail', 'stop']);
    const overload = { type: 'circuit.confirmed', circuit: 'tail', outcome: 'overload' } as const;
    trace.says(overload);
    expect(trace.refused(overload)).toEqual({ reason: 'unchangedState', ids: ['tail'] });
    expect(trace.refused({ type: 'confirm.finished' })).toEqual({
      reason: 'circuitsLeft',
      ids: ['stop'],
    });
  });
});
