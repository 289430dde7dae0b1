import { adviceOf } from '../advice';
import { cellsOf } from '../cells';
import { closingSeconds } from '../costs';
import { playOut, type Policy } from '../playOut';
import { openingSituation, Workbench } from '../situation';
import type { Planner } from '../types';

/** A planner that follows a habit, whatever that costs. O(cells x power-ups) a plan. */
export function habitPlanner(habit: Policy): Planner {
  return {
    plan: (question) => {
      const cells = cellsOf(question);
      const situation = openingSituation(cells);
      if (situation.count <= 1) {
        const section = cells.section.find((index) => index >= 0) ?? 0;
        const { tree, open, timing, elsewhere } = question;
        const seconds = closingSeconds(tree, open, timing, elsewhere);
        return { kind: 'known', section, closingSeconds: seconds };
      }
      const bench = new Workbench(cells);
      const step = habit(bench, situation);
      const length = playOut(bench, situation, habit);
      return {
        kind: 'powerUp',
        advice: adviceOf(question, cells, { step, length, optimal: false }),
      };
    },
  };
}
