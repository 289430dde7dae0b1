import { situation } from '../situation';
import { Teller } from '../testing';

const points = (trace: Teller) =>
  situation(trace.context)!.tree.sections.flatMap(({ point }) => (point ? [point.partId] : []));

describe('a point that cannot be opened', () => {
  it('joins the sections on its two sides, so that more places are left to look at', () => {
    const trace = new Teller().narrows();
    expect(points(trace)).toContain('p2');
    trace.says({ type: 'point.barred', point: 'p2', reason: 'cantReach' });
    expect(points(trace)).not.toContain('p2');
    expect(
      trace.refused({ type: 'reading.taken', circuit: 'tail', open: ['p2'], outcome: 'holds' }),
    ).toEqual({ reason: 'barredPoint', ids: ['p2'] });
    trace.reads('holds', 'p1').reads('overload', 'p3', 'l1', 'l2');
    expect(trace.step).toBe('inspect');
    const { tree, known } = situation(trace.context)!;
    expect(tree.sections[known!]!.places.map(({ ref }) => ref)).toEqual(
      expect.arrayContaining([
        { kind: 'part', id: 'p2' },
        { kind: 'run', id: 'p1-p2' },
        { kind: 'run', id: 'p2-p3' },
      ]),
    );
  });

  it('can be allowed again', () => {
    const trace = new Teller().narrows();
    trace.says({ type: 'point.barred', point: 'p2', reason: 'hardWired' });
    trace.says({ type: 'point.allowed', point: 'p2' });
    expect(points(trace)).toContain('p2');
  });

  it('keeps what was read with it open before it was barred', () => {
    const trace = new Teller().narrows().reads('holds', 'p2').reads('overload', 'l1');
    trace.says({ type: 'point.barred', point: 'p2', reason: 'cantReach' });
    const now = situation(trace.context)!;
    expect(points(trace)).not.toContain('p2');
    expect(now.belief.contradicted).toBe(false);
    expect(now.placesCleared).toContainEqual({ kind: 'run', id: 'inlet-p1' });
    const sum = now.question!.probabilities.reduce((total, each) => total + each, 0);
    expect(sum).toBeCloseTo(1, 12);
    expect(now.placesInQuestion.map(({ ref }) => ref.id)).not.toContain('p1-p2');
  });

  it('is not barred while it is open: somebody has just opened it', () => {
    const trace = new Teller().narrows().reads('holds', 'p2');
    expect(trace.refused({ type: 'point.barred', point: 'p2', reason: 'missing' })).toEqual({
      reason: 'pointsStillOpen',
      ids: ['p2'],
    });
  });

  it('drops the chosen set that it was in', () => {
    const trace = new Teller().narrows();
    trace.says({ type: 'powerUp.chosen', open: ['p2', 'l1'] });
    expect(trace.context.chosen).toEqual(['p2', 'l1']);
    trace.says({ type: 'point.barred', point: 'l1', reason: 'cantReach' });
    expect(trace.context.chosen).toBeNull();
  });
});
