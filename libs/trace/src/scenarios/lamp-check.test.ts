import { findings, lampsToCheck, reconnectList } from '../selectors/lists';
import { Teller } from '../testing';

const place = { kind: 'run', id: 'p2-p3' } as const;

const l3 = { kind: 'part', id: 'l3' } as const;

/** Repaired and proven, with plug 3 and lamp 2 still open. */
const proven = () =>
  new Teller()
    .narrows()
    .reads('holds', 'p2')
    .reads('overload', 'l2', 'p3')
    .says(
      { type: 'place.inspected', place, method: 'look', finding: 'found' },
      { type: 'repair.made', place, cause: 'Chafed', correction: 'Replaced', parts: [] },
      { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
    );

const checking = () =>
  proven().says(
    { type: 'point.reconnected', point: 'p3' },
    { type: 'point.reconnected', point: 'l2' },
  );

const powered = (circuit: string, outcome: 'holds' | 'overload' | 'flickers' = 'holds') =>
  ({ type: 'circuit.powered', circuit, outcome }) as const;

describe('the lamp check', () => {
  it('comes only after everything is connected again', () => {
    const trace = proven();
    expect(reconnectList(trace.context).map(({ id }) => id)).toEqual(['l2', 'p3']);
    expect(trace.refused(powered('tail'))).toEqual({
      reason: 'pointsStillOpen',
      ids: ['l2', 'p3'],
    });
    expect(trace.refused({ type: 'point.reconnected', point: 'p1' })).toEqual({
      reason: 'notOpen',
      ids: ['p1'],
    });
  });

  it('wants every circuit on and every lamp seen', () => {
    const trace = checking();
    const finished = { type: 'lampCheck.finished' } as const;
    expect(trace.refused(finished)).toEqual({ reason: 'circuitsLeft', ids: ['tail', 'stop'] });
    expect(
      trace.refused({ type: 'lamp.checked', circuit: 'tail', lamp: 'l1', result: 'lit' }),
    ).toEqual({ reason: 'circuitsLeft', ids: ['tail'] });
    trace.says(powered('tail'), powered('stop'));
    expect(
      trace.refused({ type: 'lamp.checked', circuit: 'stop', lamp: 'l1', result: 'lit' }),
    ).toEqual({ reason: 'unknownLamp', ids: ['l1'] });
    trace.says({ type: 'lamp.checked', circuit: 'tail', lamp: 'l2', result: 'dark' });
    expect(trace.refused(finished)).toEqual({ reason: 'lampsLeft', ids: ['l3', 'l1'] });
    trace.says({ type: 'circuit.allLit', circuit: 'tail' });
    expect(lampsToCheck(trace.context)[0]?.lamps.map(({ result }) => result)).toEqual(
      lampsToCheck(trace.context)[0]?.lamps.map(({ lamp }) => (lamp.id === 'l2' ? 'dark' : 'lit')),
    );
    trace.says({ type: 'circuit.allLit', circuit: 'stop' }, finished);
    expect(trace.step).toBe('sign');
    expect(findings(trace.context)).toEqual([
      { kind: 'lamp', circuit: 'tail', lamp: 'l2', result: 'dark' },
    ]);
  });

  it('finds another short: back to narrowing, with the lamps to be seen anew', () => {
    const trace = checking().says(powered('tail'), powered('stop', 'overload'));
    expect(trace.step).toBe('narrow');
    expect(trace.context).toMatchObject({ circuit: 'stop', hunt: 2, lampCheck: {} });
    expect(
      trace.refused({ type: 'reading.taken', circuit: 'stop', open: [], outcome: 'holds' }).reason,
    ).toBe('unchangedState');
  });

  it('asks what it means when a circuit overloads that held just now', () => {
    const trace = new Teller()
      .narrows()
      .reads('holds', 'l3')
      .says(
        { type: 'place.inspected', place: l3, method: 'swap', finding: 'found' },
        { type: 'repair.made', place: l3, cause: 'Wet', correction: 'Replaced', parts: [] },
        { type: 'point.reconnected', point: 'l3' },
        { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
        powered('tail', 'overload'),
      );
    expect(trace.step).toBe('narrow');
    expect(trace.context.contradiction).toBe('nothingLeft');
  });

  it('takes a circuit that flickers as a short that comes and goes', () => {
    const trace = new Teller()
      .starts()
      .says(
        { type: 'circuit.confirmed', circuit: 'tail', outcome: 'holds' },
        { type: 'confirm.finished' },
        { type: 'nothing.found' },
        powered('tail', 'flickers'),
      );
    expect(trace.step).toBe('narrow');
    expect(trace.context.comesAndGoes).toBe(true);
  });
});

describe('the signature', () => {
  const ready = () => {
    const trace = checking();
    for (const circuit of ['tail', 'stop']) {
      trace.says(powered(circuit), { type: 'circuit.allLit', circuit });
    }
    return trace.says({ type: 'lampCheck.finished' });
  };
  const signed = {
    type: 'trace.signed',
    name: 'Sam Okafor',
    cause: 'Chafed',
    correction: 'Replaced',
    minutes: 0,
    parts: [],
  } as const;

  it('names who, why and how long', () => {
    const trace = ready();
    const empty = { ...signed, parts: [], name: ' ', cause: '', minutes: -1 };
    expect(trace.refused(empty)).toEqual({
      reason: 'malformed',
      ids: ['name', 'cause', 'minutes'],
    });
    expect(trace.says({ ...signed, parts: [] }).context.signature).toMatchObject({
      name: 'Sam Okafor',
      minutes: 0,
      by: 'person-1',
    });
  });

  it('fixes the trace: nothing is added and nothing taken back', () => {
    const trace = ready().says({ ...signed, parts: [] });
    const target = trace.log.effective.at(-1)!.id;
    const fixed = { reason: 'fixed', ids: [trace.log.record.id] };
    expect(trace.refused({ type: 'event.undone', target })).toEqual(fixed);
    expect(trace.refused({ type: 'circuit.allLit', circuit: 'tail' })).toEqual(fixed);
  });
});
