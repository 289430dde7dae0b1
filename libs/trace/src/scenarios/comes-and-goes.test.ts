import { situation } from '../situation';
import { Teller } from '../testing';

describe('a short that comes and goes', () => {
  it('is taken as one when the first power-up flickers', () => {
    const trace = new Teller().starts();
    trace.says(
      { type: 'circuit.confirmed', circuit: 'tail', outcome: 'flickers' },
      { type: 'confirm.finished' },
    );
    expect(trace.context.comesAndGoes).toBe(true);
    trace.reads('holds', 'p2');
    // What held is less likely, not cleared.
    expect(situation(trace.context)!.placesInQuestion.map(({ ref }) => ref.id)).toContain('l1');
  });

  it('may be powered again where it held, but not where it overloaded', () => {
    const trace = new Teller().narrows().reads('flickers', 'p3');
    expect(trace.context.comesAndGoes).toBe(true);
    const again = { type: 'reading.taken', circuit: 'tail', outcome: 'holds' } as const;
    expect(trace.refused({ ...again, open: ['p3'] }).reason).toBe('unchangedState');
    // Lamp 3 hangs behind plug 3, so that opening it as well energises the same.
    expect(trace.refused({ ...again, open: ['p3', 'l3'] }).reason).toBe('unchangedState');
    trace.reads('holds', 'p2').reads('holds', 'p2');
    expect(trace.context.powerUps).toHaveLength(3);
  });

  it('counts a section as known once it is likely enough', () => {
    const trace = new Teller().narrows();
    trace.reads('flickers', 'p1');
    expect(situation(trace.context)!.known).toBe(0);
    expect(trace.step).toBe('inspect');
  });
});
