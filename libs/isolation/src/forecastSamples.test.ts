import { sectionTree } from '@lampwright/harness';
import { exactCases, largeCases } from '@lampwright/harness/testing';
import { forecastSamples, type SampledForecast } from './forecastSamples';
import { calibrationOf, decilesOf } from './forecastDeciles';
import { DEFAULT_TIMING } from './timing';
import { createHuntPlanner } from './uncertain/createHuntPlanner';

const planner = createHuntPlanner({ steps: 300 });
const treeOfCase = (name: string) => {
  const found = [...exactCases, ...largeCases].find((each) => each.name === name);
  if (!found) throw new Error(`no case ${name}`);
  return sectionTree(found.harness, found.circuit);
};

// `npm run forecast -- PLAN --detect 0.7 --samples 10000 --deciles` is the same with ten thousand traces.
describe.each(['exact-07', 'exact-12', 'large-01'])(
  'readings that show 7 of 10 shorts, %s',
  (name) => {
    let figures: SampledForecast;
    beforeAll(() => {
      const options = { detection: 0.7, samples: 1500, seed: 11 };
      figures = forecastSamples(treeOfCase(name), DEFAULT_TIMING, planner, options);
    });

    it('name the right section as often as they claim', () => {
      const { stated, actual } = calibrationOf(figures.namings);
      expect(stated).toBeGreaterThanOrEqual(0.95);
      expect(actual).toBeGreaterThanOrEqual(0.95);
      expect(Math.abs(stated - actual)).toBeLessThan(0.015);
    });

    it('are as right in each tenth as they are sure', () => {
      for (const { namings: count, stated, actual } of decilesOf(figures.namings)) {
        // Three standard deviations of a share of so few.
        const luck = 3 * Math.sqrt((stated * (1 - stated)) / count);
        expect(Math.abs(stated - actual)).toBeLessThan(luck + 1e-9);
      }
    });

    it('end no sooner than what readings can tell allows', () => {
      expect(figures.lowerBoundSeconds).toBeGreaterThan(0);
      expect(figures.expectedSeconds).toBeGreaterThan(figures.lowerBoundSeconds);
      expect(figures.worstSeconds).toBeGreaterThan(figures.expectedSeconds);
      expect(figures.proven).toBe(false);
      expect(figures.foundRate).toBe(1);
    });
  },
);

describe('random traces', () => {
  const tree = treeOfCase('exact-05');

  it('are the same for the same seed, and others for another', () => {
    const play = (seed: number) =>
      forecastSamples(tree, DEFAULT_TIMING, planner, { faults: 2, samples: 20, seed });
    expect(play(3)).toEqual(play(3));
    expect(play(3).expectedSeconds).not.toBe(play(4).expectedSeconds);
  });

  it('of one short that always shows are played as well as can be', () => {
    // The optimum of exact-05 is 455.104 s (exhaustive search), with a spread of 243 s; four standard deviations.
    const samples = 1000;
    const best = createHuntPlanner();
    const played = forecastSamples(tree, DEFAULT_TIMING, best, { samples });
    expect(Math.abs(played.expectedSeconds - 455.104)).toBeLessThan((4 * 243) / Math.sqrt(samples));
    expect(played.proven).toBe(true);
  });
});
