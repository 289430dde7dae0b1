import type { SectionTree } from '@lampwright/harness';
import { DEFAULT_TIMING } from './timing';
import { createPlanner } from './planner';

/** Two sections that one point parts, which is open now. */
const tree: SectionTree = {
  circuit: 'tail',
  sections: [
    { index: 0, parent: null, point: null, children: [1], places: [], weight: 1, probability: 0.1 },
    {
      index: 1,
      parent: 0,
      point: { partId: 'p1', openSeconds: 5, closeSeconds: 5, along: 3 },
      children: [],
      places: [],
      weight: 9,
      probability: 0.9,
    },
  ],
};

describe('a question with the only useful point open', () => {
  it('is answered with what is open now, as for a short that comes and goes', () => {
    const question = { tree, probabilities: [0.1, 0.9], open: ['p1'], timing: DEFAULT_TIMING };
    const plan = createPlanner().plan(question);
    expect(plan).toMatchObject({ kind: 'powerUp', advice: { open: ['p1'], toOpen: [] } });
  });
});
