import { basesOf } from './bases';
import type { Situation, Workbench } from './situation';

/** A set of points to have open, with what a glance says of it. */
export interface Choice {
  open: readonly number[];
  /** Bits expected from the reading for each expected second. */
  rate: number;
}

/** So many of the best first points are looked at together with further ones. */
const GROWN = 8;

/** What costs no time still counts for so many seconds, so that rates can be compared. */
const SHORTEST = 1e-6;

/** The choice that the greedy play makes: points are added as long as that raises the rate. O(cells x mostNew). */
export function greedyChoice(
  bench: Workbench,
  situation: Situation,
  mostNew: number,
): Choice | undefined {
  let best: Choice | undefined;
  const offer = (choice: Choice | undefined) => {
    if (!choice || (best && choice.rate <= best.rate)) return false;
    best = choice;
    return true;
  };
  for (const base of basesOf(bench, situation)) {
    offer(asItIs(bench, situation, base));
    let grown = bestExtension(bench, situation, base);
    for (let more = 1; offer(grown) && grown && more < mostNew; more += 1) {
      grown = bestExtension(bench, situation, grown.open);
    }
  }
  return best;
}

/**
 * The choices worth a look: what is open already or a part of it, alone and with each further point, and the best of
 * these with up to `mostNew` further points, whether or not that raises the rate. O(bases x cells x mostNew).
 */
export function choicesOf(bench: Workbench, situation: Situation, mostNew: number): Choice[] {
  const found: Choice[] = [];
  for (const base of basesOf(bench, situation)) {
    const start = asItIs(bench, situation, base);
    if (start) found.push(start);
    const firsts: Choice[] = [];
    visitExtensions(bench, situation, base, (v, share, seconds) => {
      firsts.push({ open: withPoint(base, v), rate: rateOf(share, seconds) });
    });
    firsts.sort((a, b) => b.rate - a.rate);
    found.push(...firsts);
    for (const first of firsts.slice(0, GROWN)) {
      let grown: Choice | undefined = first;
      for (let more = 2; grown && more <= mostNew; more += 1) {
        grown = bestExtension(bench, situation, grown.open);
        if (grown) found.push(grown);
      }
    }
  }
  return found;
}

/** The choice to leave just these points open, when its reading would tell anything. */
function asItIs(
  bench: Workbench,
  situation: Situation,
  open: readonly number[],
): Choice | undefined {
  // With nothing open everything has power, which tells nothing.
  const step = open.length > 0 ? bench.step(situation, open) : null;
  if (!step) return undefined;
  const share = step.onOverload.weight / situation.weight;
  return { open, rate: rateOf(share, step.seconds + share * bench.cells.overloadSeconds) };
}

function bestExtension(
  bench: Workbench,
  situation: Situation,
  base: readonly number[],
): Choice | undefined {
  let best = -1;
  let highest = -1;
  visitExtensions(bench, situation, base, (v, share, seconds) => {
    // A reading has at most 2 sqrt(p (1 - p)) bits: most points are passed over without a logarithm.
    const most = highest * Math.max(seconds, SHORTEST);
    if (most > 0 && 4 * share * (1 - share) < most * most) return;
    const rate = rateOf(share, seconds);
    if (rate <= highest) return;
    highest = rate;
    best = v;
  });
  return best < 0 ? undefined : { open: withPoint(base, best), rate: highest };
}

/** Visits every point that can be opened on top of `base`: how likely an overload then is, and in how many seconds. O(cells). */
function visitExtensions(
  bench: Workbench,
  situation: Situation,
  base: readonly number[],
  visit: (v: number, share: number, seconds: number) => void,
): void {
  const { hands, walk, weight, overloadSeconds, powerSeconds } = bench.cells;
  const energised = bench.surveyEnergised(situation, base);
  let lit = 0;
  let count = 0;
  for (const v of energised) {
    const share = weight[v] ?? 0;
    lit += share;
    if (share > 0) count += 1;
  }
  let seconds = powerSeconds;
  let farthest = situation.forced;
  const wasOpen = new Set(situation.open);
  const kept = new Set(base);
  for (const v of base) {
    if (wasOpen.has(v)) continue;
    seconds += hands[v] ?? 0;
    farthest = Math.max(farthest, walk[v] ?? 0);
  }
  for (const v of situation.open) {
    if (!kept.has(v)) farthest = Math.max(farthest, walk[v] ?? 0);
  }
  for (const v of energised) {
    const beyond = bench.countBeyond[v] ?? 0;
    if (v === 0 || beyond === 0 || beyond === count) continue;
    if (wasOpen.size > 0 && wasOpen.has(v)) continue;
    const share = (lit - (bench.beyond[v] ?? 0)) / situation.weight;
    const effort = seconds + (hands[v] ?? 0) + Math.max(farthest, walk[v] ?? 0);
    visit(v, share, effort + share * overloadSeconds);
  }
}

/** An ascending list with one more. */
function withPoint(base: readonly number[], v: number): number[] {
  const at = base.findIndex((other) => other > v);
  return at < 0 ? [...base, v] : [...base.slice(0, at), v, ...base.slice(at)];
}

/** Bits a second of a reading that is an overload with this probability; none where rounding makes it certain. */
function rateOf(share: number, seconds: number): number {
  if (share <= 0 || share >= 1) return 0;
  const bits = -share * Math.log2(share) - (1 - share) * Math.log2(1 - share);
  return bits / Math.max(seconds, SHORTEST);
}
