import type { Situation, Workbench } from './situation';

/** With more points open than this, only the heaviest of them are looked at one by one. */
const MANY = 8;

/**
 * Which of the open points stay open: none, all but one, only one, the heaviest ones, and all: with a short that comes
 * and goes, or after a change of circuit, what is open now may still tell something. At most about 3 x `MANY` sets.
 */
export function basesOf(bench: Workbench, situation: Situation): number[][] {
  const { open } = situation;
  if (open.length === 0) return [[]];
  const bases = [[], [...open]];
  if (open.length === 1) return bases;
  bench.survey(situation);
  const byWeight = [...open].sort(
    (a, b) => (bench.beyond[b] ?? 0) - (bench.beyond[a] ?? 0) || a - b,
  );
  const singly = open.length <= MANY ? open : byWeight.slice(0, MANY);
  bases.push(...singly.map((one) => open.filter((other) => other !== one)));
  if (open.length === 2) return bases;
  bases.push(...singly.map((one) => [one]));
  // Beyond a few, twice as many each time.
  for (let kept = 2; kept < open.length - 1; kept = kept < MANY ? kept + 1 : 2 * kept) {
    bases.push(byWeight.slice(0, kept).sort((a, b) => a - b));
  }
  return bases;
}
