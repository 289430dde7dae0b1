import fc from 'fast-check';
import { energisedSections, sectionTree, type SectionTree } from '@lampwright/harness';
import { exactCases, largeCases } from '@lampwright/harness/testing';
import { arbitraryQuestion } from '../testing/arbitraryQuestion';
import { settings } from '../testing/settings';
import { DEFAULT_TIMING } from '../timing';
import type { Hunt, HuntPlanner, Timing } from '../types';
import { createHuntPlanner } from '../uncertain/createHuntPlanner';
import { drawShorts } from './drawShorts';
import { playHunt, type PlayedHunt } from './playHunt';
import { remembered } from './remembered';
import { seededRandom } from './seededRandom';
import { SimulatedTrailer } from './SimulatedTrailer';

const planner = createHuntPlanner({ steps: 300 });

interface Trace {
  tree: SectionTree;
  timing: Timing;
  shorts: number[];
  seed: number;
  detection?: number;
  maxFaults?: number;
}

function play(
  { tree, timing, shorts, seed, detection = 1, maxFaults = 3 }: Trace,
  player: HuntPlanner = planner,
): PlayedHunt {
  const start: Hunt = { tree, readings: [], options: { detection, maxFaults }, open: [], timing };
  const trailer = new SimulatedTrailer(tree, shorts, detection, seededRandom(seed));
  return playHunt(start, trailer, player);
}

/** Pairs of neighbouring readings in which a state that overloaded was powered again with nothing changed. */
function poweredAgain({ hunt }: PlayedHunt): number {
  const mendedAt = new Set(hunt.mended?.map(({ after }) => after));
  return hunt.readings.filter(({ open }, at) => {
    const before = hunt.readings[at - 1];
    if (before?.outcome !== 'overload' || mendedAt.has(at)) return false;
    const energised = energisedSections(hunt.tree, open);
    return energisedSections(hunt.tree, before.open).every((on, index) => on === energised[index]);
  }).length;
}

describe.each([...exactCases, ...largeCases])('several shorts on $name', ({ harness, circuit }) => {
  const tree = sectionTree(harness, circuit);
  const runs = tree.sections.length > 20 ? 1 : 4;

  it.each(settings)('are all found where readings are true, $name', ({ timing }) => {
    const random = seededRandom(tree.sections.length);
    const player = remembered(planner);
    for (const count of [2, 3]) {
      for (let run = 0; run < runs; run += 1) {
        const shorts = drawShorts(tree, count, random);
        const played = play({ tree, timing, shorts, seed: run }, player);
        expect(played).toMatchObject({ finished: true, missed: [] });
        expect(played.namings.map(({ right }) => right)).toEqual(shorts.map(() => true));
        expect(poweredAgain(played)).toBe(0);
      }
    }
  });
});

describe.each(exactCases)(
  'one short that always shows on $name',
  ({ harness, circuit, expected }) => {
    it('is found in the least time there is', () => {
      const tree = sectionTree(harness, circuit);
      const best = remembered(createHuntPlanner());
      const timing = DEFAULT_TIMING;
      const hunt: Hunt = { tree, readings: [], options: {}, open: [], timing };
      let seconds = 0;
      for (const { index, probability } of tree.sections) {
        const trailer = new SimulatedTrailer(tree, [index], 1, () => 0);
        seconds += probability * playHunt(hunt, trailer, best).seconds;
      }
      // By exhaustive search, rounded to 0.001 s.
      expect(seconds).toBeCloseTo(expected.walk.optimumSeconds ?? NaN, 2);
    });
  },
);

describe('a hunt on any circuit', () => {
  it('finds every short, with everything closed and powered at its end', () => {
    fc.assert(
      fc.property(
        arbitraryQuestion({ points: 9, opened: false }),
        fc.constantFrom(1, 2, 3),
        fc.nat(),
        ({ tree, timing }, count, seed) => {
          const shorts = drawShorts(tree, count, seededRandom(seed));
          const played = play({ tree, timing, shorts, seed });
          expect(played).toMatchObject({ finished: true, missed: [] });
          expect(played.hunt.readings.at(-1)).toEqual({ open: [], outcome: 'holds' });
          expect(poweredAgain(played)).toBe(0);
        },
      ),
      { numRuns: 80 },
    );
  });

  it('comes to its end with readings that miss, however often', () => {
    fc.assert(
      fc.property(
        arbitraryQuestion({ points: 6, opened: false }),
        fc.constantFrom(1, 3),
        fc.constantFrom(0.98, 0.7, 0.3),
        fc.nat(),
        ({ tree, timing }, maxFaults, detection, seed) => {
          const shorts = drawShorts(tree, maxFaults, seededRandom(seed));
          const played = play({ tree, timing, shorts, seed, detection, maxFaults });
          expect(played.finished).toBe(true);
          expect(poweredAgain(played)).toBe(0);
          for (const { confidence } of played.namings)
            expect(confidence).toBeGreaterThanOrEqual(0.95);
        },
      ),
      { numRuns: 30 },
    );
  });
});
