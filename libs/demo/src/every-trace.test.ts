import { energisedSections, sectionTree } from '@lampwright/harness';
import type { CircuitId, Harness } from '@lampwright/harness';
import { createPlanner } from '@lampwright/isolation';
import {
  appendEvent,
  cautionsLeft,
  contextOf,
  defaultSettings,
  nextSeq,
  openTrace,
  situation,
  stepOf,
  TRACE_FORMAT,
} from '@lampwright/trace';
import type { TraceEvent, TraceEventBody, TraceLog } from '@lampwright/trace';
import type { DemoTrailer } from './trailers';
import { fleetCircuits } from './testing/fleet';

const planner = createPlanner();

function open(trailer: DemoTrailer, harness: Harness): TraceLog {
  return openTrace({
    format: TRACE_FORMAT,
    id: '01941f00-a005-7000-8000-000000000001',
    trailer,
    plan: { id: trailer.planId, revision: 1, harness },
    settings: defaultSettings,
    author: 'technician',
    openedAt: '2026-11-02T08:00:00.000Z',
    events: [],
  });
}

function eventOf(log: TraceLog, body: TraceEventBody): TraceEvent {
  const seq = nextSeq(log, 'tablet');
  const id = `01941f00-a006-7000-8000-${String(seq).padStart(12, '0')}`;
  return { ...body, id, device: 'tablet', seq, at: '2026-11-02T08:10:00.000Z', by: 'technician' };
}

function say(log: TraceLog, body: TraceEventBody): TraceLog {
  const outcome = appendEvent(log, eventOf(log, body));
  if (!outcome.ok) throw new Error(`${body.type}: ${JSON.stringify(outcome.refusal)}`);
  return outcome.log;
}

const intake = (circuit: CircuitId): TraceEventBody => ({
  type: 'intake.stated',
  complaint: 'It trips',
  circuits: [circuit],
  feed: { kind: 'seriesLamp', atHand: true },
});

/** Up to the first proposal of the narrowing. */
function narrowing(log: TraceLog, circuit: CircuitId): TraceLog {
  let next = say(log, intake(circuit));
  for (const caution of cautionsLeft(contextOf(next))) {
    next = say(next, { type: 'caution.ticked', caution });
  }
  next = say(next, { type: 'safety.confirmed' });
  next = say(next, { type: 'circuit.confirmed', circuit, outcome: 'overload' });
  return say(next, { type: 'confirm.finished' });
}

/** The log that each hidden section leads to. Sections with the same readings share their events. */
function playAll(start: TraceLog, circuit: CircuitId, harness: Harness): Map<number, TraceLog> {
  const bench = sectionTree(harness, circuit);
  const ends = new Map<number, TraceLog>();
  const go = (log: TraceLog, hidden: number[]) => {
    const now = situation(contextOf(log));
    if (stepOf(log) !== 'narrow' || !now?.question) {
      for (const each of hidden) ends.set(each, log);
      return;
    }
    const plan = planner.plan(now.question);
    if (plan.kind !== 'powerUp') throw new Error('narrowing, though the section is known');
    const { open: points } = plan.advice;
    const energised = energisedSections(bench, points);
    for (const outcome of ['overload', 'holds'] as const) {
      const left = hidden.filter((index) => energised[index] === (outcome === 'overload'));
      if (left.length === 0) throw new Error('a power-up that tells nothing');
      go(
        say(log, { type: 'reading.taken', circuit, open: points, outcome, advised: points }),
        left,
      );
    }
  };
  go(
    start,
    bench.sections.map(({ index }) => index),
  );
  return ends;
}

describe('a whole trace', () => {
  it.each(fleetCircuits.filter(({ trailer }) => trailer.bodyType !== 'tank'))(
    'reaches the section of every short on $circuit of $unit',
    ({ trailer, harness, circuit }) => {
      const start = narrowing(open(trailer, harness), circuit);
      const ends = playAll(start, circuit, harness);
      const { sections } = sectionTree(harness, circuit);
      expect(ends.size).toBe(sections.length);
      for (const { index, places } of sections) {
        const log = ends.get(index)!;
        const now = situation(contextOf(log));
        expect(stepOf(log), `section ${index}`).toBe('inspect');
        expect(now?.known, `section ${index}`).toBe(index);
        expect(now?.placesInQuestion.length).toBe(places.length);
        expect(contextOf(log).powerUps.length).toBeLessThanOrEqual(sections.length - 1);
      }
    },
    30_000,
  );

  it.each(fleetCircuits.filter(({ trailer }) => trailer.bodyType === 'tank'))(
    'is refused at its first statement on $circuit of $unit, a tank trailer',
    ({ trailer, harness, circuit }) => {
      const log = open(trailer, harness);
      const outcome = appendEvent(log, eventOf(log, intake(circuit)));
      expect(outcome).toMatchObject({ ok: false, refusal: { reason: 'tankTrailer' } });
    },
  );
});
