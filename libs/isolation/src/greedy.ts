import { greedyChoice } from './choices';
import type { Policy } from './playOut';

/** Always the power-up that promises the most bits a second, opening at most `mostNew` more points. O(cells x mostNew). */
export function greedy(mostNew: number): Policy {
  return (bench, situation) => {
    const choice = greedyChoice(bench, situation, mostNew);
    const step = choice && bench.step(situation, choice.open);
    if (!step) throw new Error('two cells in question that no point parts');
    return step;
  };
}
