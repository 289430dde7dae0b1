import { energisedSections } from '@lampwright/harness';
import { closingSeconds, pointsOf, powerUpSeconds } from '../costs';
import type { Question } from '../types';

/**
 * The least expected seconds of a question by trying every set of points at every turn, with nothing left out and
 * nothing but the cost functions shared with the planner. For up to five points.
 */
export function bruteForceSeconds({ tree, probabilities, open, timing }: Question): number {
  const ids = pointsOf(tree).map(({ partId }) => partId);
  const sets = Array.from({ length: 2 ** ids.length }, (_, mask) =>
    ids.filter((_id, at) => (mask >> at) & 1),
  );
  const litBySet = sets.map((set) => energisedSections(tree, set));
  const costs = sets.map((from) => sets.map((to) => powerUpSeconds(tree, from, to, timing)));
  const closing = sets.map((set) => closingSeconds(tree, set, timing));
  const known = new Map<string, number>();

  const weighted = (left: number[], at: number): number => {
    const sum = left.reduce((total, section) => total + (probabilities[section] ?? 0), 0);
    if (left.length === 1) return sum * (closing[at] ?? 0);
    const key = `${left.join()}|${at}`;
    const before = known.get(key);
    if (before !== undefined) return before;
    let best = Infinity;
    sets.forEach((_, next) => {
      const lit = left.filter((section) => litBySet[next]?.[section]);
      const dark = left.filter((section) => !litBySet[next]?.[section]);
      const cost = costs[at]?.[next];
      if (lit.length === 0 || dark.length === 0 || !cost) return;
      const share = lit.reduce((total, section) => total + (probabilities[section] ?? 0), 0);
      const seconds = share * cost.overload + (sum - share) * cost.holds;
      if (seconds >= best) return;
      best = Math.min(best, seconds + weighted(lit, next) + weighted(dark, next));
    });
    known.set(key, best);
    return best;
  };

  const start = sets.findIndex(
    (set) => set.length === open.length && set.every((id) => open.includes(id)),
  );
  const inQuestion = [...probabilities.keys()].filter((at) => (probabilities[at] ?? 0) > 0);
  return weighted(inQuestion, start);
}
