import { coolDownDue } from '../feeds';
import { isAt } from '../selectors/stepOf';
import type { TraceEventBody } from '../events';
import { fuse, seriesLamp, Teller } from '../testing';

const reading: TraceEventBody & { type: 'reading.taken' } = {
  type: 'reading.taken',
  circuit: 'tail',
  open: ['l1'],
  outcome: 'holds',
};

/** Confirmed and read twice, each time the fuse blew. */
const hot = () =>
  new Teller().narrows(['tail'], fuse).reads('overload', 'p3').reads('overload', 'p2');

describe('a fuse that blows again and again', () => {
  it('asks for a cool-down at the limit of the shop', () => {
    const trace = hot();
    expect(trace.context.overloads).toBe(3);
    expect(isAt(trace.log, 'coolDown')).toBe(true);
    expect(trace.refused(reading)).toEqual({ reason: 'coolDownNeeded', ids: ['3'] });
    trace.says({ type: 'coolDown.taken' });
    expect(isAt(trace.log, 'deciding')).toBe(true);
    trace.says({ ...reading, open: ['p2', 'l1'] });
  });

  it('or goes on with a lamp in series', () => {
    const trace = hot();
    trace.says({ type: 'feed.changed', feed: { kind: 'breaker', breakerType: 2, atHand: true } });
    expect(isAt(trace.log, 'coolDown')).toBe(true);
    trace.says({ type: 'feed.changed', feed: seriesLamp });
    expect(isAt(trace.log, 'deciding')).toBe(true);
    expect(coolDownDue(trace.context)).toBe(false);
    trace.reads('holds', 'p2', 'l1');
  });

  it('counts nothing on a feed that limits the current', () => {
    const trace = new Teller().narrows().reads('overload', 'p3').reads('overload', 'p2');
    expect(trace.context.overloads).toBe(0);
    expect(isAt(trace.log, 'deciding')).toBe(true);
  });

  it('lets a person look meanwhile', () => {
    const trace = hot().says({ type: 'inspection.started' });
    expect(trace.step).toBe('inspect');
    trace.says({ type: 'narrowing.resumed' });
    expect(isAt(trace.log, 'coolDown')).toBe(true);
  });
});
