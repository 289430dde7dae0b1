import type { Situation, Workbench } from './situation';

/**
 * Which of the open points stay open: none, all but one, only one, the heaviest ones, and all: with a short that comes
 * and goes, or after a change of circuit, what is open now may still tell something. O(open points) sets.
 */
export function basesOf(bench: Workbench, situation: Situation): number[][] {
  const { open } = situation;
  if (open.length === 0) return [[]];
  const bases = [[], [...open]];
  if (open.length === 1) return bases;
  bases.push(...open.map((one) => open.filter((other) => other !== one)));
  if (open.length === 2) return bases;
  bases.push(...open.map((one) => [one]));
  bench.survey(situation);
  const byWeight = [...open].sort(
    (a, b) => (bench.beyond[b] ?? 0) - (bench.beyond[a] ?? 0) || a - b,
  );
  for (let kept = 2; kept < open.length - 1; kept += 1) {
    bases.push(byWeight.slice(0, kept).sort((a, b) => a - b));
  }
  return bases;
}
