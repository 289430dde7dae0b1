import { foldTrace } from '../traceLog';
import { TRACE_FORMAT } from '../record';
import { stepOf } from '../selectors/stepOf';
import { newRecord, Teller, truthfulTester } from '../testing';
import formatOne from '../testing/fixtures/format-1.json';
import formatOneState from '../testing/fixtures/format-1.state.json';
import formatTwo from '../testing/fixtures/format-2.json';
import formatTwoState from '../testing/fixtures/format-2.state.json';
import { readTraceEvent } from './readTraceEvent';
import { readTraceRecord } from './readTraceRecord';

const saved = () => new Teller().narrows().reads('holds', 'p2').log.record;
const faultsOf = (input: unknown) => {
  const reading = readTraceRecord(input);
  return reading.ok ? [] : reading.faults;
};

describe('reading a record', () => {
  it.each([
    ['format 1', formatOne, formatOneState],
    ['format 2', formatTwo, formatTwoState],
  ])('saved in %s folds to the state that it had', (_name, file, state) => {
    const reading = readTraceRecord(file);
    if (!reading.ok) throw new Error(JSON.stringify(reading.faults));
    expect(reading.value.format).toBe(TRACE_FORMAT);
    const log = foldTrace(reading.value);
    expect(log.skipped).toEqual([]);
    const { record, ...context } = log.snapshot.context;
    expect({ step: stepOf(log), value: log.snapshot.value, context }).toEqual(state);
    expect(record.plan.harness).toEqual(file.plan.harness);
  });

  it('lifts events of format 1 to an unknown device, in their order', () => {
    const reading = readTraceRecord(formatOne);
    const events = reading.ok ? reading.value.events : [];
    expect(events.map(({ seq }) => seq)).toEqual(events.map((_, index) => index + 1));
    expect(new Set(events.map(({ device }) => device))).toEqual(new Set(['unknown']));
  });

  it('gives back what was written', () => {
    const record = saved();
    expect(readTraceRecord(JSON.parse(JSON.stringify(record)))).toEqual({
      ok: true,
      value: record,
    });
  });

  it.each([
    [3, 'newerFormat'],
    [0, 'unknownFormat'],
    [1.5, 'unknownFormat'],
  ])('refuses format %d by name', (format, code) => {
    expect(faultsOf({ ...saved(), format })).toEqual([{ path: 'format', code, found: format }]);
  });

  it.each([null, 7, 'text', [], {}])('refuses %j as no record', (input) => {
    expect(faultsOf(input)).toEqual([{ path: 'format', code: 'unknownFormat' }]);
  });

  it('names the fault of a plan, and repeated or missing numbers', () => {
    const record = saved();
    const harness = { ...record.plan.harness, parts: record.plan.harness.parts.slice(1) };
    const [first, second] = record.events;
    const faults = faultsOf({
      ...record,
      plan: { ...record.plan, harness },
      events: [first, first, { ...second, seq: 9 }],
    });
    expect(faults).toContainEqual(
      expect.objectContaining({
        code: 'planFault',
        plan: expect.objectContaining({ code: 'noInlet' }) as unknown,
      }),
    );
    expect(faults).toContainEqual({ path: 'events[1].id', code: 'repeatedId', found: first!.id });
    expect(faults).toContainEqual({ path: 'events[2].seq', code: 'outOfSequence', found: 9 });
  });

  it('tells where a value is wrong', () => {
    const record = saved();
    expect(faultsOf({ ...record, trailer: { ...record.trailer, bodyType: 'boat' } })).toEqual([
      { path: 'trailer.bodyType', code: 'invalid' },
    ]);
  });
});

describe('reading an event', () => {
  const event = new Teller().event({ type: 'trace.abandoned', reason: 'Wrong trailer' });
  const codesOf = (input: unknown) => {
    const reading = readTraceEvent(input);
    return reading.ok ? [] : reading.faults.map(({ path, code }) => [path, code]);
  };

  it('takes every event that a whole trace has', () => {
    const record = newRecord();
    const events = truthfulTester(record, [{ kind: 'run', id: 'p1-p2' }], {
      dark: [{ lamp: 'l1', note: 'On order' }],
    });
    for (const each of events) expect(readTraceEvent(each)).toEqual({ ok: true, value: each });
  });

  it.each([
    ['a text that is too long', { reason: 'x'.repeat(2001) }, ['reason', 'tooBig']],
    ['a key that is not known', { mood: 'bad' }, ['', 'unknownKey']],
    ['a time that is none', { at: 'yesterday' }, ['at', 'invalid']],
    ['a number below 1', { seq: 0 }, ['seq', 'invalid']],
    ['a type that is not known', { type: 'lamp.kicked' }, ['type', 'invalid']],
  ])('refuses %s', (_what, change, fault) => {
    expect(codesOf({ ...event, ...change })).toEqual([fault]);
  });

  it('refuses lists beyond any trailer, and a breaker type on what is none', () => {
    const open = Array.from({ length: 501 }, (_, index) => `p${index}`);
    expect(codesOf({ ...event, reason: undefined, type: 'powerUp.chosen', open })).toContainEqual([
      'open',
      'tooBig',
    ]);
    const feed = { kind: 'fuse', breakerType: 1, atHand: true };
    const changed = new Teller().event({ type: 'safety.confirmed' });
    expect(codesOf({ ...changed, type: 'feed.changed', feed })).toEqual([
      ['feed.breakerType', 'invalid'],
    ]);
  });
});
