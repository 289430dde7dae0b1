import { energisedSections } from '@lampwright/harness';
import { forecast } from './forecast';
import { plan } from './planner';
import { priorOf, treeOf } from './testing/trees';
import { DEFAULT_TIMING } from './timing';

const chain = (length: number) => treeOf(Array.from({ length }, (_, index) => index - 1));

describe('plan', () => {
  it('knows the section when only one is left', () => {
    const tree = chain(3);
    expect(plan({ tree, probabilities: [0, 1, 0], open: ['p2'], timing: DEFAULT_TIMING })).toEqual({
      kind: 'known',
      section: 1,
      closingSeconds: 1,
    });
  });

  it('splits a chain of equal sections in the middle', () => {
    const tree = chain(8);
    const next = plan({ tree, probabilities: priorOf(tree), open: [], timing: DEFAULT_TIMING });
    expect(next).toMatchObject({
      kind: 'powerUp',
      advice: { open: ['p4'], toOpen: ['p4'], toClose: [], overloadProbability: 0.5 },
    });
  });

  it('closes what keeps power from everything in question', () => {
    const tree = chain(8);
    const probabilities = [0, 0, 0, 0, 0.25, 0.25, 0.25, 0.25];
    const next = plan({ tree, probabilities, open: ['p4'], timing: DEFAULT_TIMING });
    expect(next).toMatchObject({ advice: { toOpen: ['p6'], toClose: ['p4'], open: ['p6'] } });
    if (next.kind !== 'powerUp') return;
    const lit = energisedSections(tree, next.advice.open).flatMap((on, at) => (on ? [at] : []));
    expect(next.advice.energised).toEqual(lit);
  });

  it('keeps its word where forty points part the same few sections', () => {
    // The nearer a point, the longer it takes to open: none of them can be left out.
    const tree = treeOf(
      Array.from({ length: 41 }, (_, index) => index - 1),
      (at) => ({ weight: at % 20 === 0 ? 1 : 0, openSeconds: 5 + at, along: 60 - at }),
    );
    const next = plan({ tree, probabilities: priorOf(tree), open: [], timing: DEFAULT_TIMING });
    if (next.kind !== 'powerUp') throw new Error('three are left');
    const { expectedSeconds } = forecast(tree, DEFAULT_TIMING, { plan });
    expect(next.advice.expectedSeconds).toBeGreaterThanOrEqual(expectedSeconds - 1e-6);
  });

  it('says when it is asked about nothing', () => {
    const tree = chain(2);
    expect(() => plan({ tree, probabilities: [0, 0], open: [], timing: DEFAULT_TIMING })).toThrow(
      RangeError,
    );
  });
});
