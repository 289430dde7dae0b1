import { readHarness } from '../../reader/readHarness';
import { readHarnessText } from '../../reader/readHarnessText';
import { goodPlan } from './goodPlan';
import { malformedPlans } from './malformedPlans';

describe('malformed plans', () => {
  it('are damaged copies of a plan that is good', () => {
    expect(readHarness(goodPlan)).toEqual({ ok: true, harness: goodPlan });
  });

  it.each(malformedPlans)('$name', (plan) => {
    const reading = 'text' in plan ? readHarnessText(plan.text) : readHarness(plan.document);
    expect(reading).toEqual({ ok: false, faults: plan.faults, more: false });
  });

  it('have names of their own', () => {
    const names = malformedPlans.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
  });
});
