import { createActor } from 'xstate';
import { appendEvent, nextSeq } from './appendEvent';
import { stepOf } from './selectors/stepOf';
import { newRecord, Teller } from './testing';
import { traceLogic } from './traceLogic';

describe('appending an event', () => {
  it('takes the same event twice, whatever the order of its keys', () => {
    const trace = new Teller().starts();
    const last = trace.log.record.events.at(-1)!;
    const turned = Object.fromEntries(Object.entries(last).reverse()) as typeof last;
    expect(appendEvent(trace.log, turned)).toEqual({ ok: true, log: trace.log, duplicate: true });
  });

  it('refuses another content under the same id', () => {
    const trace = new Teller().starts();
    const last = trace.log.record.events.at(-1)!;
    expect(appendEvent(trace.log, { ...last, by: 'person-2' })).toEqual({
      ok: false,
      refusal: { reason: 'malformed', ids: [last.id] },
    });
  });

  it('counts each device for itself', () => {
    const trace = new Teller().starts();
    expect(nextSeq(trace.log, 'phone')).toBe(1);
    const body = { type: 'circuit.confirmed', circuit: 'tail', outcome: 'overload' } as const;
    const event = { ...trace.event(body), device: 'phone', seq: 1 };
    const outcome = appendEvent(trace.log, event);
    expect(outcome.ok && nextSeq(outcome.log, 'phone')).toBe(2);
    expect(outcome.ok && nextSeq(outcome.log, 'tablet')).toBe(nextSeq(trace.log, 'tablet'));
  });
});

describe('a trace as an actor', () => {
  it('goes on with what is accepted and tells why something was not', () => {
    const actor = createActor(traceLogic, { input: newRecord() }).start();
    const teller = new Teller();
    actor.send(teller.event({ type: 'safety.confirmed' }));
    expect(actor.getSnapshot().context.lastRefusal?.reason).toBe('notInThisStep');
    for (const event of new Teller().starts().log.record.events) actor.send(event);
    const { log, lastRefusal } = actor.getSnapshot().context;
    expect([stepOf(log), lastRefusal]).toEqual(['confirm', null]);
  });
});
