import { sectionTree } from '@lampwright/harness';
import { exactCases } from '@lampwright/harness/testing';
import { firstQuestion, forecast } from './forecast';
import { createPlanner } from './planner';
import { settings } from './testing/settings';

describe.each(exactCases)('forecast of $name', ({ harness, circuit }) => {
  const tree = sectionTree(harness, circuit);
  const planner = createPlanner();

  it.each(settings)('keeps what the first advice promises, $name', ({ timing }) => {
    const first = planner.plan(firstQuestion(tree, timing));
    const { expectedSeconds, worstSeconds, lowerBoundSeconds } = forecast(tree, timing, planner);
    expect(first.kind).toBe('powerUp');
    if (first.kind !== 'powerUp') return;
    expect(expectedSeconds).toBeLessThanOrEqual(first.advice.expectedSeconds + 1e-6);
    expect(lowerBoundSeconds).toBeLessThanOrEqual(expectedSeconds + 1e-6);
    expect(worstSeconds).toBeGreaterThanOrEqual(expectedSeconds - 1e-6);
  });
});
