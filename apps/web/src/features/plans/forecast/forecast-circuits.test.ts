import { sectionTree, type CircuitId } from '@lampwright/harness';
import { goodPlan } from '@lampwright/harness/testing';
import { DEFAULT_TIMING, QUICK_STEPS, THOROUGH_STEPS } from '@lampwright/isolation';
import type { CircuitForecast, PlannerClient } from '../../../lib/planner';
import { forecastCircuits, outlooksOf } from './forecast-circuits';
import { withoutPlugs } from './testing/without-plugs';

const figures: CircuitForecast = {
  expectedSeconds: 300,
  worstSeconds: 500,
  expectedPowerUps: 3,
  lowerBoundSeconds: 200,
  proven: false,
  foundRate: 1,
  easiestFirstSeconds: 400,
  halfByCountSeconds: 350,
};

type Asked = [tree: { circuit: CircuitId }, timing: unknown, steps: number];

/** A planner that answers with `answer` and notes what it was asked. */
function noting(answer: (circuit: CircuitId, steps: number) => Partial<CircuitForecast>) {
  const asked: [CircuitId, number][] = [];
  const planner = {
    ask: async (_: 'forecast', [tree, , steps]: Asked, { signal }: { signal: AbortSignal }) => {
      signal.throwIfAborted();
      asked.push([tree.circuit, steps]);
      return { ...figures, ...answer(tree.circuit, steps) };
    },
  } as unknown as PlannerClient;
  return { planner, asked };
}

const circuits = goodPlan.circuits.map(({ id }) => id);

async function toldBy(
  planner: PlannerClient,
  leaving = new AbortController(),
  after: () => void = () => undefined,
) {
  const told: [CircuitId, CircuitForecast][] = [];
  await forecastCircuits(goodPlan, {
    planner,
    timing: DEFAULT_TIMING,
    signal: leaving.signal,
    tell: (circuit, forecast) => {
      told.push([circuit, forecast]);
      after();
    },
  });
  return told;
}

describe('forecasts of a plan', () => {
  it('has circuits whose sections can be told apart', () => {
    expect(outlooksOf(goodPlan).map(({ circuit }) => circuit)).toEqual(circuits);
    for (const { circuit, sections } of outlooksOf(goodPlan)) {
      expect(sections).toBe(sectionTree(goodPlan, circuit).sections.length);
    }
  });

  it('are told circuit by circuit, and thought through again only where not proven best', async () => {
    const [first] = circuits;
    const { planner, asked } = noting((circuit) => ({ proven: circuit !== first }));
    const told = await toldBy(planner);
    expect(asked).toEqual([
      ...circuits.map((circuit) => [circuit, QUICK_STEPS]),
      [first, THOROUGH_STEPS],
    ]);
    expect(told.map(([circuit]) => circuit)).toEqual([...circuits, first]);
  });

  it('keep the shorter play and the higher bound of the two', async () => {
    const { planner } = noting((_, steps) =>
      steps === QUICK_STEPS
        ? {}
        : { expectedSeconds: 310, worstSeconds: 480, lowerBoundSeconds: 220 },
    );
    const last = (await toldBy(planner)).at(-1)?.[1];
    expect(last).toMatchObject({
      expectedSeconds: 300,
      worstSeconds: 500,
      lowerBoundSeconds: 220,
      proven: false,
    });
  });

  it('are not asked for any more once nobody looks', async () => {
    const { planner, asked } = noting(() => ({}));
    const leaving = new AbortController();
    const told = toldBy(planner, leaving, () => leaving.abort());
    await expect(told).rejects.toThrow(/aborted/);
    expect(asked).toHaveLength(1);
  });

  it('leave out a circuit with nothing to part', async () => {
    const { planner, asked } = noting(() => ({}));
    await forecastCircuits(withoutPlugs(goodPlan), {
      planner,
      timing: DEFAULT_TIMING,
      signal: new AbortController().signal,
      tell: () => undefined,
    });
    expect(asked).toEqual([]);
  });
});
