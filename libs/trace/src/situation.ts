import {
  sectionTree,
  type PartId,
  type PlaceRef,
  type SectionTree,
  type SeparablePoint,
} from '@lampwright/harness';
import {
  believe,
  type Belief,
  type Question,
  type Reading,
  type Timing,
} from '@lampwright/isolation';
import { coarsen } from './coarsen';
import { countingPowerUps, readingOf } from './countingReadings';
import { focus } from './focus';
import { samePlace } from './places';
import { placesCleared, placesInQuestion, type RatedPlace } from './ratedPlaces';
import { sharedFactor } from './sharedPlaces';
import type { TraceContext } from './state';

/** Where the narrowing of one circuit stands, computed from the context alone. */
export interface Situation {
  /** The circuit in the sections that can still be told apart; barred points are not separable. */
  tree: SectionTree;
  /** The readings that count, oldest first. */
  readings: Reading[];
  /** By the sections of `tree`. */
  belief: Belief;
  /** Sections that may hold the short, most likely first. */
  sectionsInQuestion: number[];
  /** Places that may hold the short, most likely first. */
  placesInQuestion: RatedPlace[];
  /** Places that the readings speak free. */
  placesCleared: PlaceRef[];
  timing: Timing;
  /** What to ask a planner; `null` while the readings contradict each other. */
  question: Question | null;
  /** The section that holds a short; `null` while more than one may. */
  known: number | null;
}

/** How much likelier damage makes a place. Common practice, no source. */
const DAMAGE_FACTOR = 4;
/** How much likelier a repaired place is than before. Common practice, no source. */
const REPAIRED_FACTOR = 0.1;
/** From this probability on a section counts as known where no reading is beyond doubt. Common practice, no source. */
const KNOWN = 0.95;
/** Stands for 1 after rounding. */
const CERTAIN = 1 - 1e-9;

/** The section of `Situation.tree` that surely holds a short; `null` while several are in question. */
export function knownSectionOf(context: TraceContext): number | null {
  return situation(context)?.known ?? null;
}

const kept = new WeakMap<TraceContext, Situation | null>();

/**
 * Where the narrowing stands; `null` before a circuit is narrowed. The answer is kept for each context, so that screens
 * may ask as often as they like. O(sections × readings) with one short; with two or three as `believe` says.
 */
export function situation(context: TraceContext): Situation | null {
  let answer = kept.get(context);
  if (answer === undefined) kept.set(context, (answer = work(context)));
  return answer;
}

function work(context: TraceContext): Situation | null {
  const { circuit } = context;
  if (circuit === null) return null;
  const powerUps = countingPowerUps(context, circuit);
  const readings = powerUps.map(readingOf);
  const barred = new Set(context.barred.map(({ point }) => point));
  const tree = treeOf(context, circuit, barred);
  const fine = fineTree(context, circuit, barred, readings) ?? tree;
  const finely = believe(fine, readings, options(context));
  const belief = fine === tree ? finely : coarsen(finely, fine, tree);
  return {
    tree,
    readings,
    belief,
    sectionsInQuestion: belief.inQuestion,
    placesInQuestion: placesInQuestion(fine, finely, tree),
    placesCleared: placesCleared(fine, finely, readings),
    timing: timingOf(context),
    question: belief.contradicted ? null : questionOf(context, tree, belief, readings),
    known: knownSection(context, belief),
  };
}

function questionOf(
  context: TraceContext,
  tree: SectionTree,
  belief: Belief,
  readings: readonly Reading[],
): Question {
  const last = context.powerUps.findLast(({ circuit }) => circuit === tree.circuit);
  return {
    tree,
    probabilities: focus(tree, belief, readings, context.maxFaults),
    open: context.open,
    elsewhere: openElsewhere(context, tree),
    // Before its first power-up of the narrowing a circuit was powered with everything connected.
    poweredWith: last?.open ?? [],
    timing: timingOf(context),
  };
}

/** What is open on other circuits: to be closed in the end too. */
function openElsewhere(context: TraceContext, tree: SectionTree): SeparablePoint[] {
  const own = new Set(tree.sections.map(({ point }) => point?.partId));
  return context.record.plan.harness.parts.flatMap(({ id, at, separable }) =>
    separable && context.open.includes(id) && !own.has(id)
      ? [{ partId: id, ...separable, along: at.along }]
      : [],
  );
}

/** How the shop's detection probabilities apply now. */
function options(context: TraceContext): { detection: number; maxFaults: number } {
  const { steady, comesAndGoes } = context.record.settings.detection;
  return {
    detection: context.comesAndGoes ? comesAndGoes : steady,
    maxFaults: context.maxFaults,
  };
}

/**
 * A point may be barred after it was opened. What was read with it open stays true, so belief is formed with it still
 * separable, and only then told over the sections that can be parted from now on.
 */
function fineTree(
  context: TraceContext,
  circuit: string,
  barred: ReadonlySet<PartId>,
  readings: readonly Reading[],
): SectionTree | null {
  const opened = new Set(readings.flatMap(({ open }) => open));
  const never = new Set([...barred].filter((point) => !opened.has(point)));
  return never.size === barred.size ? null : treeOf(context, circuit, never);
}

function treeOf(
  context: TraceContext,
  circuit: string,
  notSeparable: ReadonlySet<PartId>,
): SectionTree {
  const shared = sharedFactor(context);
  return sectionTree(context.record.plan.harness, circuit, {
    notSeparable,
    factor: (ref) => factorOf(context, ref) * shared(ref),
  });
}

function factorOf(context: TraceContext, ref: PlaceRef): number {
  const damaged = context.damage.some(({ place }) => samePlace(place, ref));
  const repaired = context.repairs.some(({ place }) => samePlace(place, ref));
  return (damaged ? DAMAGE_FACTOR : 1) * (repaired ? REPAIRED_FACTOR : 1);
}

/** The shop's times on the feed in use. */
function timingOf({ record: { settings }, feed }: TraceContext): Timing {
  return {
    powerSeconds: settings.powerSeconds,
    walkSecondsPerMetre: feed?.atHand ? 0 : settings.walkSecondsPerMetre,
    powerAlong: settings.powerAlong,
    overloadSeconds: feed ? settings.overloadSeconds[feed.kind] : 0,
  };
}

function knownSection(context: TraceContext, belief: Belief): number | null {
  const first = belief.inQuestion[0];
  if (belief.contradicted || first === undefined) return null;
  const { detection, maxFaults } = options(context);
  const enough = detection < 1 || maxFaults > 1 ? KNOWN : CERTAIN;
  return (belief.probabilities[first] ?? 0) >= enough ? first : null;
}
