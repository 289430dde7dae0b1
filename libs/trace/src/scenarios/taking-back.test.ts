import { canUndo } from '../appendEvent';
import { effectiveEvents } from '../effectiveEvents';
import { Teller } from '../testing';

describe('undo', () => {
  it('takes back a slip of the finger and keeps it on the record', () => {
    const trace = new Teller().narrows();
    const before = trace.context;
    trace.reads('overload', 'p2').undo();
    expect(trace.context).toEqual(before);
    expect(trace.log.record.events.map(({ type }) => type).slice(-2)).toEqual([
      'reading.taken',
      'event.undone',
    ]);
    expect(effectiveEvents(trace.log.record.events).at(-1)?.type).toBe('confirm.finished');
    trace.reads('holds', 'p2');
    expect(trace.context.powerUps).toHaveLength(1);
  });

  it('goes back step by step as far as the first event', () => {
    const trace = new Teller().narrows();
    while (canUndo(trace.log)) trace.undo();
    expect(trace.step).toBe('intake');
    expect(trace.refused({ type: 'event.undone', target: 'any' })).toEqual({
      reason: 'nothingToUndo',
      ids: ['any'],
    });
  });

  it('takes back only the newest event that stands, and no undo', () => {
    const trace = new Teller().narrows().reads('overload', 'p2');
    const [first] = trace.log.effective;
    const newest = trace.log.effective.at(-1)!.id;
    expect(trace.refused({ type: 'event.undone', target: first!.id })).toEqual({
      reason: 'notTheLastEvent',
      ids: [newest],
    });
    trace.undo();
    const undo = trace.log.record.events.at(-1)!.id;
    expect(trace.refused({ type: 'event.undone', target: undo }).reason).toBe('notTheLastEvent');
  });
});
