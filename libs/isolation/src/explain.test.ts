import { explain } from './explain';
import { firstQuestion } from './forecast';
import { easiestFirstSeconds, halfByCountSeconds } from './habits';
import { plan } from './planner';
import { treeOf } from './testing/trees';
import { DEFAULT_TIMING } from './timing';

const chain = treeOf([-1, 0, 1, 2, 3, 4, 5, 6], (at) => ({
  openSeconds: 20,
  closeSeconds: 10,
  along: at,
}));

describe('explain', () => {
  it('tells the split, what each reading leaves and what else could be done', () => {
    const question = firstQuestion(chain, DEFAULT_TIMING);
    const next = plan(question);
    const facts = explain(question, next);
    if (facts.kind !== 'powerUp' || next.kind !== 'powerUp') throw new Error('eight are left');
    const { overload, holds } = facts.after;
    expect(overload.sections).toEqual(next.advice.energised);
    expect([...overload.sections, ...holds.sections]).toEqual(facts.sections);
    expect(overload.probability + holds.probability).toBeCloseTo(1, 12);
    expect(overload.seconds).toBe(next.advice.seconds.overload);
    // One point is open then: ten seconds to close it, and the walk there and back.
    const at = Number(next.advice.open[0]?.slice(1));
    expect(holds.closingSeconds).toBe(10 + 2 * at);
    expect(facts.easiestFirstSeconds).toBe(easiestFirstSeconds(question));
    expect(facts.halfByCountSeconds).toBe(halfByCountSeconds(question));
  });

  it('offers two other points, the better one first, none better than the advice', () => {
    const question = firstQuestion(chain, DEFAULT_TIMING);
    const next = plan(question);
    const facts = explain(question, next);
    if (facts.kind !== 'powerUp' || next.kind !== 'powerUp') throw new Error('eight are left');
    const [first, second] = facts.alternatives;
    expect(facts.alternatives).toHaveLength(2);
    expect(first?.open).not.toEqual(next.advice.open);
    expect(first?.extraSeconds).toBeGreaterThanOrEqual(0);
    expect(second?.extraSeconds).toBeGreaterThanOrEqual(first?.extraSeconds ?? Infinity);
  });

  it('says what is left when the section is known', () => {
    const question = { ...firstQuestion(chain, DEFAULT_TIMING), open: ['p3'] };
    question.probabilities = question.probabilities.map((_, at) => (at === 5 ? 1 : 0));
    expect(explain(question, plan(question))).toEqual({
      kind: 'known',
      section: 5,
      places: 0,
      closingSeconds: 16,
    });
  });
});
