import { clamp } from './geometry';

/**
 * Moves values on a line as little as possible (least squares) so that neighbours are at least `gap` apart and all lie
 * within `low` and `high`. The order of `targets`, which must ascend, is kept. Where they cannot all fit they are spread
 * evenly over the whole line.
 *
 * With each value shifted by its rank times the gap the task is an isotonic regression, solved by pooling neighbours
 * that are out of order; bounds only clamp that answer. O(n).
 */
export function spaceOut(
  targets: readonly number[],
  gap: number,
  low: number,
  high: number,
): number[] {
  const last = targets.length - 1;
  if (last * gap > high - low) {
    return targets.map((_, rank) => low + ((high - low) * (rank + 0.5)) / (last + 1));
  }
  const pools: { sum: number; count: number }[] = [];
  targets.forEach((target, rank) => {
    let pool = { sum: target - rank * gap, count: 1 };
    for (let left = pools.at(-1); left && mean(left) > mean(pool); left = pools.at(-1)) {
      pools.pop();
      pool = { sum: left.sum + pool.sum, count: left.count + pool.count };
    }
    pools.push(pool);
  });
  return pools
    .flatMap((pool) => Array.from({ length: pool.count }, () => mean(pool)))
    .map((value, rank) => clamp(value, low, high - last * gap) + rank * gap);
}

function mean(pool: { sum: number; count: number }): number {
  return pool.sum / pool.count;
}
