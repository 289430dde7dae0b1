import { Teller } from '../testing';

const abandoned = { type: 'trace.abandoned', reason: 'Wrong trailer' } as const;

describe('a trace begun by mistake', () => {
  it('ends while nothing was opened and nothing read', () => {
    for (const trace of [new Teller(), new Teller().starts(), new Teller().narrows()]) {
      expect(trace.says(abandoned).step).toBe('abandoned');
      expect(trace.refused({ type: 'safety.confirmed' }).reason).toBe('fixed');
    }
  });

  it('does not end with something open', () => {
    const trace = new Teller().narrows().reads('holds', 'p2');
    expect(trace.refused(abandoned)).toEqual({ reason: 'pointsStillOpen', ids: ['p2'] });
  });

  it('does not end once a reading was taken, even with all connected again', () => {
    const trace = new Teller().narrows().reads('overload', 'p3').reads('holds');
    const readings = trace.context.powerUps.map(({ eventId }) => eventId);
    expect(trace.refused(abandoned)).toEqual({ reason: 'notInThisStep', ids: readings });
  });
});
