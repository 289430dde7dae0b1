import { foldTrace } from './traceLog';
import { Teller } from './testing';

describe('a stored record that this program would not have written', () => {
  it('is folded as far as it goes, and what does not fit is named', () => {
    const { record } = new Teller().narrows().reads('holds', 'p2').log;
    const stray = { ...record.events[0]!, id: 'stray' };
    const undo = {
      ...record.events[0]!,
      id: 'undo',
      type: 'event.undone',
      target: 'none',
    } as const;
    const events = [...record.events.slice(0, -1), stray, undo, record.events.at(-1)!];
    const log = foldTrace({ ...record, events });
    expect(log.skipped.map(({ id, refusal }) => [id, refusal.reason])).toEqual([
      ['stray', 'notInThisStep'],
      ['undo', 'notTheLastEvent'],
    ]);
    expect(log.snapshot.context.powerUps).toHaveLength(1);
  });
});
