import type { SectionTree } from '@lampwright/harness';
import { drawShorts } from './play/drawShorts';
import { playHunt, type Naming } from './play/playHunt';
import { seededRandom } from './play/seededRandom';
import { remembered } from './play/remembered';
import { SimulatedTrailer } from './play/SimulatedTrailer';
import { huntBoundSeconds } from './forecastBound';
import type { Hunt, HuntPlanner, Timing } from './types';

/** Which traces are played. */
export interface SampleOptions {
  /** Shorts hidden in each: 1, 2 or 3. Default 1. */
  faults?: number;
  /** Probability that an energised short shows in one power-up. Default 1. */
  detection?: number;
  /** Default 1000. */
  samples?: number;
  /** Default 1. */
  seed?: number;
}

/** What traces took where readings may miss or several shorts are there. */
export interface SampledForecast {
  /** Mean over the traces, which are drawn as often as they are likely. */
  expectedSeconds: number;
  /** The longest of the traces. */
  worstSeconds: number;
  expectedPowerUps: number;
  /** No order of work can beat this expectation. */
  lowerBoundSeconds: number;
  /** Whether every decision was optimal. */
  proven: boolean;
  /** Share of the traces in which every short was found. */
  foundRate: number;
  /** Every section that was named as short, in the order of the traces. */
  namings: Naming[];
}

/** The most shorts that a person who finds more than one believes in. */
const MOST_FAULTS = 3;

/**
 * Plays a planner against random traces. With one short hidden it believes in one; with several, in up to three, as
 * nobody knows their number beforehand. The same options give the same figures. O(samples x power-ups) plans.
 */
export function forecastSamples(
  tree: SectionTree,
  timing: Timing,
  planner: HuntPlanner,
  { faults = 1, detection = 1, samples = 1000, seed = 1 }: SampleOptions = {},
): SampledForecast {
  // Each trace has its own chance, so that two planners meet the same shorts and the same luck.
  const random = seededRandom(seed);
  const options = { detection, maxFaults: faults > 1 ? MOST_FAULTS : 1 };
  const start: Hunt = { tree, readings: [], options, open: [], timing };
  let seconds = 0;
  let worstSeconds = 0;
  let powerUps = 0;
  let found = 0;
  const namings: Naming[] = [];
  let proven = true;
  const player = remembered(planner);
  for (let run = 0; run < samples; run += 1) {
    const shorts = drawShorts(tree, faults, random);
    const chance = seededRandom(Math.floor(random() * 2 ** 32));
    const trailer = new SimulatedTrailer(tree, shorts, detection, chance);
    const played = playHunt(start, trailer, player);
    seconds += played.seconds;
    worstSeconds = Math.max(worstSeconds, played.seconds);
    powerUps += played.powerUps;
    if (played.finished && played.missed.length === 0) found += 1;
    namings.push(...played.namings);
    proven &&= played.optimal;
  }
  return {
    expectedSeconds: seconds / samples,
    worstSeconds,
    expectedPowerUps: powerUps / samples,
    lowerBoundSeconds: huntBoundSeconds(tree, timing, { faults, detection }),
    proven,
    foundRate: found / samples,
    namings,
  };
}
