import { summaryOf } from '../selectors/summaryOf';
import { situation } from '../situation';
import { Teller } from '../testing';

describe('a plain hunt', () => {
  it('goes from complaint to signature', () => {
    const trace = new Teller().narrows();
    expect(trace.step).toBe('narrow');
    trace.reads('holds', 'p2');
    expect(situation(trace.context)?.placesCleared).toContainEqual({ kind: 'run', id: 'inlet-p1' });
    trace.reads('overload', 'p3', 'l2');
    expect(trace.step).toBe('inspect');
    const place = { kind: 'run', id: 'p2-p3' } as const;
    trace.says({ type: 'place.inspected', place, method: 'look', finding: 'found' });
    expect(trace.step).toBe('repair');
    trace.says({ type: 'repair.made', place, cause: 'Chafed', correction: 'Replaced', parts: [] });
    expect(trace.step).toBe('prove');
    trace.says({ type: 'proof.read', circuit: 'tail', outcome: 'holds' });
    expect(trace.step).toBe('reconnect');
    trace.says({ type: 'point.reconnected', point: 'p3' });
    expect(trace.step).toBe('reconnect');
    trace.says({ type: 'point.reconnected', point: 'l2' });
    expect(trace.step).toBe('lampCheck');
    trace.finishes();
    expect(summaryOf(trace.log)).toEqual({
      step: 'signed',
      complaint: 'Fuse blows with the lights on',
      circuits: ['tail'],
      powerUps: 3,
      found: 'Plug p2 – Plug p3',
      signedAt: expect.stringMatching(/^2026-11-02T08:/) as string,
    });
  });
});
