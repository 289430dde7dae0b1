import { cellsOf } from './cells';
import { playOut, type Policy } from './playOut';
import { openingSituation, Workbench, type Situation } from './situation';
import type { Question } from './types';

/**
 * Expected seconds of the habit of unplugging whatever is quickest to unplug and plug in again, one point at a time and
 * everything else closed, until the section is known and all is closed. O(cells x power-ups).
 */
export function easiestFirstSeconds(question: Question): number {
  return secondsOf(easiestFirst, question);
}

/** The same for the habit of halving the number of sections in question, whatever it takes. O(cells x power-ups). */
export function halfByCountSeconds(question: Question): number {
  return secondsOf(halfByCount, question);
}

export const easiestFirst: Policy = oneAtATime(({ cells }, v) => cells.hands[v] ?? 0);

export const halfByCount: Policy = oneAtATime(({ countBeyond }, v, { count }) =>
  Math.abs(2 * (countBeyond[v] ?? 0) - count),
);

function secondsOf(habit: Policy, question: Question): number {
  const cells = cellsOf(question);
  const bench = new Workbench(cells);
  return cells.closing + playOut(bench, openingSituation(cells), habit).weighted;
}

/** Opens the one useful point with the least of something, the first of equals, and closes all others. */
function oneAtATime(least: (bench: Workbench, v: number, situation: Situation) => number): Policy {
  return (bench, situation) => {
    bench.survey(situation);
    let chosen = -1;
    let lowest = Infinity;
    for (const v of situation.cells) {
      const beyond = bench.countBeyond[v] ?? 0;
      if (v === 0 || beyond === 0 || beyond === situation.count) continue;
      const value = least(bench, v, situation);
      if (value >= lowest) continue;
      lowest = value;
      chosen = v;
    }
    const step = bench.step(situation, [chosen], true);
    if (!step) throw new Error('two cells in question that no point parts');
    return step;
  };
}
