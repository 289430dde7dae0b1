import {
  energisedSections,
  placeKey,
  placesOnCircuit,
  sectionByPlace,
  sectionTree,
} from '@lampwright/harness';
import type { PartId, SectionTree } from '@lampwright/harness';
import { believe, createPlanner, DEFAULT_TIMING } from '@lampwright/isolation';
import type { Reading, Timing } from '@lampwright/isolation';
import { fleetCircuits } from './testing/fleet';

/** How the planner's loop ended for a short hidden in one section. */
interface End {
  section: number;
  powerUps: number;
}

/**
 * Plays the loop for every section at once: truthful readings depend on the hidden section alone, so sections that
 * have given the same readings share one belief and one plan.
 */
function playAll(tree: SectionTree, timing: Timing): Map<number, End> {
  const ends = new Map<number, End>();
  const go = (hidden: number[], readings: Reading[], open: readonly PartId[]) => {
    const belief = believe(tree, readings);
    expect([...belief.inQuestion].sort((a, b) => a - b)).toEqual(hidden);
    const plan = planner.plan({ tree, probabilities: belief.probabilities, open, timing });
    if (plan.kind === 'known') {
      for (const each of hidden) {
        ends.set(each, { section: plan.section, powerUps: readings.length });
      }
      return;
    }
    const energised = energisedSections(tree, plan.advice.open);
    const overload = hidden.filter((index) => energised[index]);
    const holds = hidden.filter((index) => !energised[index]);
    expect(overload.length, 'a power-up that tells nothing').toBeGreaterThan(0);
    expect(holds.length, 'a power-up that tells nothing').toBeGreaterThan(0);
    const next = plan.advice.open;
    go(overload, [...readings, { open: next, outcome: 'overload' }], next);
    go(holds, [...readings, { open: next, outcome: 'holds' }], next);
  };
  go(
    tree.sections.map(({ index }) => index),
    [],
    [],
  );
  return ends;
}

const planner = createPlanner();

const settings: [name: string, timing: Timing][] = [
  ['on foot', DEFAULT_TIMING],
  [
    'with power at hand and a breaker',
    { ...DEFAULT_TIMING, walkSecondsPerMetre: 0, overloadSeconds: 40 },
  ],
];

describe.each(settings)('the planner, %s', (_, timing) => {
  it.each(fleetCircuits)(
    'finds a short in every place of $circuit on $unit',
    ({ harness, circuit }) => {
      const tree = sectionTree(harness, circuit);
      const ends = playAll(tree, timing);
      const home = sectionByPlace(tree);
      const places = placesOnCircuit(harness, circuit);
      expect(places.length).toBeGreaterThan(tree.sections.length);
      for (const { ref } of places) {
        const end = ends.get(home.get(placeKey(ref)) ?? -1);
        expect(end?.section, placeKey(ref)).toBe(home.get(placeKey(ref)));
        expect(end?.powerUps, placeKey(ref)).toBeLessThanOrEqual(tree.sections.length - 1);
      }
    },
    30_000,
  );
});
