import { clamp } from './geometry';

/**
 * Moves values on a line as little as possible (least squares) so that neighbours keep their gap and all lie within
 * `low` and `high`. The order of `targets`, which must ascend, is kept. Where they cannot all fit they are spread evenly
 * over the whole line.
 *
 * With each value shifted by the gaps before it the task is an isotonic regression, solved by pooling neighbours that
 * are out of order; bounds only clamp that answer. O(n).
 *
 * @param gap one for all, or the gap that follows each value.
 */
export function spaceOut(
  targets: readonly number[],
  gap: number | readonly number[],
  low: number,
  high: number,
): number[] {
  const before = [0];
  for (let rank = 1; rank < targets.length; rank += 1) {
    const step = typeof gap === 'number' ? gap : (gap[rank - 1] ?? 0);
    before.push((before[rank - 1] ?? 0) + step);
  }
  const whole = before.at(-1) ?? 0;
  if (whole > high - low) {
    return targets.map((_, rank) => low + ((high - low) * (rank + 0.5)) / targets.length);
  }
  const pools: { sum: number; count: number }[] = [];
  targets.forEach((target, rank) => {
    let pool = { sum: target - (before[rank] ?? 0), count: 1 };
    for (let left = pools.at(-1); left && mean(left) > mean(pool); left = pools.at(-1)) {
      pools.pop();
      pool = { sum: left.sum + pool.sum, count: left.count + pool.count };
    }
    pools.push(pool);
  });
  return pools
    .flatMap((pool) => Array.from({ length: pool.count }, () => mean(pool)))
    .map((value, rank) => clamp(value, low, high - whole) + (before[rank] ?? 0));
}

function mean(pool: { sum: number; count: number }): number {
  return pool.sum / pool.count;
}
