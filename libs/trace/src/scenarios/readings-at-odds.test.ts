import { meaningsFor } from '../meanings';
import { situation } from '../situation';
import { Teller } from '../testing';

describe('readings that contradict each other', () => {
  it('holding with everything connected is a question, not an answer', () => {
    const trace = new Teller().narrows().reads('overload', 'p3').reads('holds');
    expect(trace.step).toBe('narrow');
    expect(trace.context.contradiction).toBe('holdsAllConnected');
    expect(meaningsFor(trace.context)).toEqual([
      'repairedByHandling',
      'comesAndGoes',
      'planIsWrong',
    ]);
    expect(situation(trace.context)).toMatchObject({ question: null, known: null });
    expect(
      trace.refused({ type: 'reading.taken', circuit: 'tail', open: ['p1'], outcome: 'holds' }),
    ).toEqual({
      reason: 'contradictionOpen',
      ids: ['repairedByHandling', 'comesAndGoes', 'planIsWrong'],
    });
  });

  it('handling may have repaired it: proven with all of the circuit connected', () => {
    const trace = new Teller().narrows().reads('overload', 'p3').reads('holds');
    trace.says({ type: 'contradiction.explained', meaning: 'repairedByHandling' });
    expect(trace.step).toBe('prove');
    trace.says({ type: 'proof.read', circuit: 'tail', outcome: 'holds' });
    expect(trace.step).toBe('lampCheck');
    trace.finishes();
    expect(trace.context.repairs).toEqual([]);
  });

  it('it may come and go: the sections that held are in question again', () => {
    const trace = new Teller().narrows().reads('overload', 'p3').reads('holds');
    trace.says({ type: 'contradiction.explained', meaning: 'comesAndGoes' });
    expect(trace.context).toMatchObject({ comesAndGoes: true, contradiction: null });
    expect(trace.step).toBe('narrow');
    expect(situation(trace.context)!.sectionsInQuestion.length).toBeGreaterThan(1);
  });

  it('the plan may be wrong: nothing read so far counts, and it stays on the record', () => {
    const trace = new Teller().narrows().reads('overload', 'p3').reads('holds');
    trace.says({ type: 'contradiction.explained', meaning: 'planIsWrong' });
    expect(trace.context.contradiction).toBeNull();
    expect(trace.context.powerUps.map(({ counts }) => counts)).toEqual([false, false]);
    expect(situation(trace.context)!.sectionsInQuestion).toHaveLength(7);
  });

  it('an overload where nothing is left in question is said, and what explains it is asked', () => {
    const trace = new Teller().narrows().reads('holds', 'p2').reads('overload', 'p3', 'l1');
    expect(trace.step).toBe('narrow');
    trace.reads('overload', 'p2', 'l1');
    expect(trace.context.contradiction).toBe('nothingLeft');
    expect(meaningsFor(trace.context)).toEqual(['comesAndGoes', 'secondShort', 'planIsWrong']);
    // What held is energised alone: no second short explains that it overloads now.
    trace.says({ type: 'contradiction.explained', meaning: 'secondShort' });
    expect(trace.context).toMatchObject({ contradiction: 'nothingLeft', maxFaults: 2 });
    trace.says({ type: 'contradiction.explained', meaning: 'secondShort' });
    expect(meaningsFor(trace.context)).toEqual(['comesAndGoes', 'planIsWrong']);
    expect(trace.refused({ type: 'contradiction.explained', meaning: 'secondShort' })).toEqual({
      reason: 'contradictionOpen',
      ids: ['comesAndGoes', 'planIsWrong'],
    });
    trace.says({ type: 'contradiction.explained', meaning: 'comesAndGoes' });
    expect(trace.context.contradiction).toBeNull();
  });

  it('a section whose every place is clear is a contradiction of its own', () => {
    const trace = new Teller().narrows().reads('holds', 'l3');
    expect(trace.step).toBe('inspect');
    const resumed = { type: 'narrowing.resumed' } as const;
    expect(trace.refused(resumed)).toEqual({ reason: 'notInThisStep', ids: ['part:l3'] });
    const place = { kind: 'part', id: 'l3' } as const;
    trace.says({ type: 'place.inspected', place, method: 'meter', finding: 'clear' }, resumed);
    expect(trace.step).toBe('narrow');
    expect(trace.context.contradiction).toBe('sectionClear');
    expect(meaningsFor(trace.context)).toContain('repairedByHandling');
    trace.says({ type: 'contradiction.explained', meaning: 'comesAndGoes' });
    expect(trace.step).toBe('narrow');
    expect(trace.context.contradiction).toBeNull();
  });
});
