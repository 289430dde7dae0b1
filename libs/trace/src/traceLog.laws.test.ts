import fc from 'fast-check';
import { createPlanner } from '@lampwright/isolation';
import { transition } from 'xstate';
import { appendEvent, canUndo, nextSeq } from './appendEvent';
import type { TraceEvent, TraceEventBody } from './events';
import { Player } from './play/Player';
import { PlayedTrailer } from './play/PlayedTrailer';
import { playedId } from './play/playedId';
import { situation } from './situation';
import { fuse, Teller } from './testing';
import { anyBody } from './testing/anyBody';
import { foldTrace, type TraceLog } from './traceLog';
import { traceMachine } from './traceMachine';

const choose = createPlanner({ steps: 20 });

/** One thing that happens: something arbitrary, what a sensible person does next, or an undo. */
const anyDeed = fc.oneof(
  { weight: 5, arbitrary: fc.constant('sensible' as const) },
  { weight: 1, arbitrary: fc.constant('undo' as const) },
  { weight: 5, arbitrary: anyBody },
);

const place = { kind: 'run', id: 'p2-p3' } as const;
const inspecting = () => new Teller().narrows().reads('holds', 'p2').reads('overload', 'p3', 'l2');
const proving = () =>
  inspecting().says(
    { type: 'place.inspected', place, method: 'look', finding: 'found' },
    { type: 'repair.made', place, cause: 'Chafed', correction: 'Replaced', parts: [] },
  );
const checking = () =>
  proving().says(
    { type: 'point.reconnected', point: 'p3' },
    { type: 'point.reconnected', point: 'l2' },
    { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
  );
/** From the start little is reached that way, so sequences begin anywhere. */
const beginnings = [
  new Teller(),
  new Teller().starts(['tail', 'stop']),
  new Teller().narrows(['tail', 'stop'], fuse),
  new Teller().narrows().reads('overload', 'p3').reads('holds'),
  inspecting(),
  proving(),
  checking(),
].map(({ log }) => log);

const deeds = fc.record({
  beginning: fc.constantFrom(...beginnings),
  list: fc.array(anyDeed, { maxLength: 40, size: 'max' }),
  seed: fc.integer({ min: 1, max: 1000 }),
  device: fc.constantFrom('tablet', 'phone'),
});

type Deeds = typeof deeds extends fc.Arbitrary<infer Value> ? Value : never;

/** Tries the deeds one after the other and reports each try. */
function tryAll(
  { beginning, list, seed, device }: Deeds,
  report: (before: TraceLog, event: TraceEvent, after: TraceLog | null) => void = () => undefined,
): TraceLog {
  const short = {
    circuit: 'tail',
    place,
    cause: 'Chafed',
    correction: 'Replaced',
    parts: [],
  };
  const story = {
    complaint: '',
    circuits: ['tail', 'stop'],
    feed: fuse,
    shorts: [short],
    name: 'A',
  };
  const player = new Player(story, new PlayedTrailer([short], 0.8, seed), choose);
  let log = beginning;
  for (const deed of list) {
    const body = bodyOf(deed, log, player);
    if (!body) continue;
    const seq = nextSeq(log, device);
    const at = Date.parse(log.record.openedAt) + seq * 1000;
    const event: TraceEvent = {
      ...body,
      id: playedId(`laws ${device}`, log.record.events.length + 1, at),
      device,
      seq,
      at: new Date(at).toISOString(),
      by: 'person-1',
    };
    const outcome = appendEvent(log, event);
    report(log, event, outcome.ok ? outcome.log : null);
    if (outcome.ok) log = outcome.log;
  }
  return log;
}

function bodyOf(
  deed: TraceEventBody | 'sensible' | 'undo',
  log: TraceLog,
  player: Player,
): TraceEventBody | null {
  if (deed === 'undo') return { type: 'event.undone', target: log.effective.at(-1)?.id ?? 'none' };
  if (deed !== 'sensible') return deed;
  try {
    return player.move(log);
  } catch {
    // Someone arbitrary has found what is not there; a sensible person cannot repair it.
    return null;
  }
}

const plain = (log: TraceLog) => ({
  value: log.snapshot.value,
  context: log.snapshot.context,
  effective: log.effective,
  record: log.record,
});
const overJson = <Value>(value: Value) => JSON.parse(JSON.stringify(value)) as Value;

describe('for any sequence of events', () => {
  it('a fold never throws, and folding the record is the same as appending one by one', () => {
    fc.assert(
      fc.property(deeds, (all) => {
        const log = tryAll(all);
        const folded = foldTrace(overJson(log.record));
        expect(folded.skipped).toEqual([]);
        expect(plain(folded)).toEqual(plain(log));
      }),
      { numRuns: 60 },
    );
  });

  it('a refused event leaves everything as it was, and has its facts', () => {
    fc.assert(
      fc.property(deeds, (all) => {
        tryAll(all, (before, event) => {
          const frozen = JSON.stringify(plain(before));
          const outcome = appendEvent(before, event);
          expect(JSON.stringify(plain(before))).toBe(frozen);
          if (!outcome.ok) expect(outcome.refusal.ids?.length).toBeGreaterThan(0);
        });
      }),
      { numRuns: 60 },
    );
  });

  it('the same event again is a duplicate', () => {
    fc.assert(
      fc.property(deeds, (all) => {
        const log = tryAll(all);
        for (const event of log.record.events) {
          const outcome = appendEvent(log, overJson(event));
          expect(outcome).toEqual({ ok: true, log, duplicate: true });
        }
      }),
      { numRuns: 60 },
    );
  });

  it('undoing the last event is the same as never having sent it', () => {
    fc.assert(
      fc.property(deeds, (all) => {
        tryAll(all, (before, event, after) => {
          if (!after || !canUndo(after) || event.type === 'event.undone') return;
          const undone = appendEvent(after, {
            id: 'undo',
            device: 'other',
            seq: nextSeq(after, 'other'),
            at: event.at,
            by: event.by,
            type: 'event.undone',
            target: event.id,
          });
          expect(undone.ok && undone.log.snapshot.context).toEqual(before.snapshot.context);
          expect(undone.ok && undone.log.snapshot.value).toEqual(before.snapshot.value);
          expect(undone.ok && undone.log.effective).toEqual(before.effective);
        });
      }),
      { numRuns: 60 },
    );
  });

  it('the context survives a round trip through JSON, and the machine goes on from it alike', () => {
    fc.assert(
      fc.property(deeds, (all) => {
        tryAll(all, (before, event) => {
          const { value, context } = before.snapshot;
          expect(overJson(context)).toEqual(context);
          const restored = traceMachine.resolveState({ value, context: overJson(context) });
          const [next] = transition(traceMachine, restored, event);
          const [expected] = transition(traceMachine, before.snapshot, event);
          expect([next.value, next.context]).toEqual([expected.value, expected.context]);
        });
      }),
      { numRuns: 30 },
    );
  });

  it('a question to the planner is whole: probabilities that sum to 1, on points that can be opened', () => {
    fc.assert(
      fc.property(deeds, (all) => {
        const { context } = tryAll(all).snapshot;
        const now = situation(context);
        if (!now?.question) return;
        const sum = now.question.probabilities.reduce((total, each) => total + each, 0);
        expect(sum).toBeCloseTo(1, 9);
        const barred = context.barred.map(({ point }) => point);
        for (const { point } of now.tree.sections) expect(barred).not.toContain(point?.partId);
      }),
      { numRuns: 60 },
    );
  });
});
