/**
 * A planner that asks a clock, in milliseconds, before and after each plan and keeps the differences in `took`.
 */
export function timed<Asked, Answer>(
  planner: { plan(asked: Asked): Answer },
  clock: () => number,
): { plan(asked: Asked): Answer; took: number[] } {
  const took: number[] = [];
  return {
    took,
    plan: (asked) => {
      const from = clock();
      const answer = planner.plan(asked);
      took.push(clock() - from);
      return answer;
    },
  };
}
