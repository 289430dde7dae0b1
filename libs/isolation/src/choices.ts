import type { Situation, Workbench } from './situation';

/** A set of points to have open, with what a glance says of it. */
export interface Choice {
  open: readonly number[];
  /** Bits expected from the reading for each expected second; 0 when the reading would tell nothing. */
  rate: number;
}

/**
 * The choices worth a look in a situation. Each starts from a part of what is open already and opens up to `mostNew`
 * more points, one after the other, always the one that brings the highest rate. With `everyFirst` each point gets its
 * turn as the first one opened; otherwise only the best does. O(cells x bases x mostNew).
 */
export function choicesOf(
  bench: Workbench,
  situation: Situation,
  mostNew: number,
  everyFirst: boolean,
): Choice[] {
  const found: Choice[] = [];
  for (const base of basesOf(bench, situation)) {
    const start = rateOf(bench, situation, base);
    if (start > 0) found.push({ open: base, rate: start });
    const firsts = extensions(bench, situation, base);
    if (everyFirst) found.push(...firsts);
    let best = bestOf(firsts);
    for (let more = 1; best && more <= mostNew; more += 1) {
      if (!everyFirst || more > 1) found.push(best);
      const next = more < mostNew ? bestOf(extensions(bench, situation, best.open)) : undefined;
      best = next && next.rate > best.rate ? next : undefined;
    }
  }
  return found;
}

/** The choice with the highest rate; of equal ones the first. */
export function bestOf(choices: readonly Choice[]): Choice | undefined {
  let best: Choice | undefined;
  for (const choice of choices) if (!best || choice.rate > best.rate) best = choice;
  return best;
}

/**
 * Which of the open points stay open: none, all but one, only one, the heaviest ones that together are about half, and
 * all: with a short that comes and goes, or after a change of circuit, what is open now may still tell something.
 * O(open points) sets.
 */
function basesOf(bench: Workbench, situation: Situation): number[][] {
  const { open } = situation;
  if (open.length === 0) return [[]];
  bench.survey(situation);
  const byWeight = [...open].sort(
    (a, b) => (bench.beyond[b] ?? 0) - (bench.beyond[a] ?? 0) || a - b,
  );
  const ascending = (some: number[]) => some.sort((a, b) => a - b);
  const bases = [[], [...open], ...open.map((one) => open.filter((other) => other !== one))];
  if (open.length > 2) bases.push(...open.map((one) => [one]));
  for (let kept = 2; kept < open.length - 1; kept += 1) {
    bases.push(ascending(byWeight.slice(0, kept)));
  }
  return bases;
}

function rateOf(bench: Workbench, situation: Situation, open: readonly number[]): number {
  const step = bench.step(situation, open);
  if (!step) return 0;
  const share = step.onOverload.weight / situation.weight;
  return bits(share) / (step.seconds + share * bench.cells.overloadSeconds);
}

/** Every way to open one more point on top of `base`. O(cells). */
function extensions(bench: Workbench, situation: Situation, base: readonly number[]): Choice[] {
  const { hands, walk, overloadSeconds, powerSeconds } = bench.cells;
  const energised = bench.surveyEnergised(situation, base);
  let lit = 0;
  let count = 0;
  for (const v of energised) {
    const share = bench.cells.weight[v] ?? 0;
    lit += share;
    if (share > 0) count += 1;
  }
  let seconds = powerSeconds;
  let farthest = situation.forced;
  for (const v of base) {
    if (situation.open.includes(v)) continue;
    seconds += hands[v] ?? 0;
    farthest = Math.max(farthest, walk[v] ?? 0);
  }
  for (const v of situation.open) {
    if (!base.includes(v)) farthest = Math.max(farthest, walk[v] ?? 0);
  }
  const choices: Choice[] = [];
  for (const v of energised) {
    const beyond = bench.countBeyond[v] ?? 0;
    if (v === 0 || beyond === 0 || beyond === count || situation.open.includes(v)) continue;
    const share = (lit - (bench.beyond[v] ?? 0)) / situation.weight;
    const cost =
      seconds + (hands[v] ?? 0) + Math.max(farthest, walk[v] ?? 0) + share * overloadSeconds;
    choices.push({ open: [...base, v].sort((a, b) => a - b), rate: bits(share) / cost });
  }
  return choices;
}

/** Entropy of a reading that is an overload with this probability, in bits. */
function bits(share: number): number {
  if (share <= 0 || share >= 1) return 0;
  return -share * Math.log2(share) - (1 - share) * Math.log2(1 - share);
}
