import { appendEvent } from './appendEvent';
import type { TraceEvent } from './events';
import type { Refusal, RefusalReason } from './state';
import { fuse, newRecord, seriesLamp, Teller } from './testing';

const run = { kind: 'run', id: 'p2-p3' } as const;
const reading = (...open: string[]) =>
  ({ type: 'reading.taken', circuit: 'tail', open, outcome: 'holds' }) as const;

function sent(trace: Teller, change: Record<string, unknown>): Refusal {
  const event = { ...trace.event({ type: 'safety.confirmed' }), ...change } as TraceEvent;
  const outcome = appendEvent(trace.log, event);
  if (outcome.ok) throw new Error('It was accepted.');
  return outcome.refusal;
}

const repaired = () =>
  new Teller()
    .narrows()
    .reads('holds', 'p2')
    .reads('overload', 'l2', 'p3')
    .says(
      { type: 'place.inspected', place: run, method: 'look', finding: 'found' },
      { type: 'repair.made', place: run, cause: 'Chafed', correction: 'Replaced', parts: [] },
    );

const checking = () =>
  repaired().says(
    { type: 'point.reconnected', point: 'l2' },
    { type: 'point.reconnected', point: 'p3' },
    { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
  );

/** For every reason one way to be refused for it, with its facts. A new reason does not compile without one. */
const reached: Record<RefusalReason, { told: () => Refusal; ids: string[] }> = {
  notInThisStep: {
    told: () => new Teller().refused({ type: 'nothing.found' }),
    ids: ['nothing.found'],
  },
  tankTrailer: {
    told: () =>
      new Teller(newRecord({ bodyType: 'tank' })).refused({
        type: 'intake.stated',
        complaint: '',
        circuits: ['tail'],
        feed: seriesLamp,
      }),
    ids: ['trailer-1'],
  },
  unknownCircuit: {
    told: () =>
      new Teller().refused({
        type: 'intake.stated',
        complaint: '',
        circuits: ['tail', 'horn'],
        feed: seriesLamp,
      }),
    ids: ['horn'],
  },
  unknownPoint: { told: () => new Teller().narrows().refused(reading('p1', 'p9')), ids: ['p9'] },
  unknownPlace: {
    told: () =>
      new Teller().narrows().refused({ type: 'damage.seen', place: { kind: 'run', id: 'w9' } }),
    ids: ['run:w9'],
  },
  unknownLamp: {
    told: () =>
      checking()
        .says({ type: 'circuit.powered', circuit: 'tail', outcome: 'holds' })
        .refused({ type: 'lamp.checked', circuit: 'tail', lamp: 'p1', result: 'lit' }),
    ids: ['p1'],
  },
  notSeparable: { told: () => new Teller().narrows().refused(reading('inlet')), ids: ['inlet'] },
  barredPoint: {
    told: () =>
      new Teller()
        .narrows()
        .says({ type: 'point.barred', point: 'p2', reason: 'missing' })
        .refused({ type: 'powerUp.chosen', open: ['p2'] }),
    ids: ['p2'],
  },
  notOpen: {
    told: () => repaired().refused({ type: 'point.reconnected', point: 'p2' }),
    ids: ['p2'],
  },
  unchangedState: { told: () => new Teller().narrows().refused(reading()), ids: ['tail'] },
  coolDownNeeded: {
    told: () =>
      new Teller()
        .narrows(['tail'], fuse)
        .reads('overload', 'p3')
        .reads('overload', 'p2')
        .refused(reading('p2', 'l1')),
    ids: ['3'],
  },
  contradictionOpen: {
    told: () =>
      new Teller().narrows().reads('overload', 'p3').reads('holds').refused(reading('p1')),
    ids: ['repairedByHandling', 'comesAndGoes', 'planIsWrong'],
  },
  cautionsLeft: {
    told: () =>
      new Teller(newRecord({ abs: true }))
        .starts(['tail'], { kind: 'ohmmeter', atHand: true })
        .refused({ type: 'feed.changed', feed: fuse }),
    ids: ['noHolding'],
  },
  circuitsLeft: {
    told: () => new Teller().starts(['tail', 'stop']).refused({ type: 'confirm.finished' }),
    ids: ['tail', 'stop'],
  },
  nothingChosen: {
    told: () =>
      new Teller().refused({
        type: 'intake.stated',
        complaint: 'No lamps',
        circuits: [],
        feed: seriesLamp,
      }),
    ids: ['circuits'],
  },
  pointsStillOpen: {
    told: () =>
      repaired()
        .says({ type: 'point.reconnected', point: 'l2' })
        .says({ type: 'proof.read', circuit: 'tail', outcome: 'holds' })
        .refused({ type: 'lampCheck.finished' }),
    ids: ['p3'],
  },
  repairNotEnergised: {
    told: () =>
      new Teller()
        .narrows()
        .reads('holds', 'p1')
        .says({ type: 'inspection.started' })
        .says(
          { type: 'place.inspected', place: run, method: 'look', finding: 'found' },
          { type: 'repair.made', place: run, cause: '', correction: '', parts: [] },
        )
        .refused({ type: 'proof.read', circuit: 'tail', outcome: 'holds' }),
    ids: ['p1'],
  },
  lampsLeft: {
    told: () =>
      checking()
        .says(
          { type: 'circuit.powered', circuit: 'tail', outcome: 'holds' },
          { type: 'circuit.powered', circuit: 'stop', outcome: 'holds' },
          { type: 'circuit.allLit', circuit: 'tail' },
        )
        .refused({ type: 'lampCheck.finished' }),
    ids: ['l3'],
  },
  nothingToUndo: {
    told: () => new Teller().refused({ type: 'event.undone', target: 'x' }),
    ids: ['x'],
  },
  notTheLastEvent: {
    told: () => {
      const trace = new Teller().starts();
      return { ...trace.refused({ type: 'event.undone', target: 'x' }), ids: ['newest'] };
    },
    ids: ['newest'],
  },
  fixed: {
    told: () => checking().finishes().refused({ type: 'coolDown.taken' }),
    ids: [newRecord().id],
  },
  outOfSequence: { told: () => sent(new Teller(), { seq: 2 }), ids: ['tablet', '1'] },
  malformed: { told: () => sent(new Teller(), { type: 'lamp.kicked' }), ids: ['lamp.kicked'] },
};

it.each(Object.entries(reached))('refuses as %s, with the facts', (reason, { told, ids }) => {
  expect(told()).toEqual({ reason, ids });
});
