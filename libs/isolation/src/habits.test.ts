import { sectionTree } from '@lampwright/harness';
import { exactCases, largeCases } from '@lampwright/harness/testing';
import { firstQuestion } from './forecast';
import { easiestFirstSeconds, halfByCountSeconds } from './habits';
import { settings } from './testing/settings';

// Source of the figures: the case files of the plan format, computed independently of this library.
describe.each([...exactCases, ...largeCases])('$name', ({ harness, circuit, expected }) => {
  const tree = sectionTree(harness, circuit);

  it.each(settings)(
    'takes the usual habits as long as the file says, $name',
    ({ name, timing }) => {
      const question = firstQuestion(tree, timing);
      const { easiestFirstSeconds: easiest, halfByCountSeconds: half } = expected[name];
      if (easiest !== null) expect(easiestFirstSeconds(question)).toBeCloseTo(easiest, 2);
      if (half !== null) expect(halfByCountSeconds(question)).toBeCloseTo(half, 2);
    },
  );
});
