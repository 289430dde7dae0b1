import { sectionTree, type CircuitId, type Harness, type SectionTree } from '@lampwright/harness';
import { QUICK_STEPS, THOROUGH_STEPS, type Timing } from '@lampwright/isolation';
import type { CircuitForecast, PlannerClient } from '../../../lib/planner';

/** A circuit in sections, with its forecast once there is one. */
export interface CircuitOutlook {
  circuit: CircuitId;
  name: string;
  /** How many sections openings can tell apart; with one there is nothing to find. */
  sections: number;
  forecast: CircuitForecast | null;
}

/** The circuits of a plan before anything is worked out. */
export function outlooksOf(harness: Harness): CircuitOutlook[] {
  return harness.circuits.map(({ id, name }) => ({
    circuit: id,
    name,
    sections: sectionTree(harness, id).sections.length,
    forecast: null,
  }));
}

interface Work {
  planner: PlannerClient;
  timing: Timing;
  signal: AbortSignal;
  /** Hears of every circuit, and again where thinking longer sharpens what it was told. */
  tell: (circuit: CircuitId, forecast: CircuitForecast) => void;
}

/**
 * Works out one circuit after the other, so that the first rows stand while the last are still thought about: a quick
 * round first, then a thorough one for what the quick one could not prove best.
 *
 * @throws what the planner throws, and the signal's reason once nobody looks any more; what was told before stands.
 */
export async function forecastCircuits(harness: Harness, work: Work): Promise<void> {
  const { planner, timing, signal, tell } = work;
  const ask = (tree: SectionTree, steps: number) =>
    planner.ask('forecast', [tree, timing, steps], { background: true, signal });
  const unproven: [tree: SectionTree, quick: CircuitForecast][] = [];
  for (const { id } of harness.circuits) {
    const tree = sectionTree(harness, id);
    if (tree.sections.length < 2) continue;
    const quick = await ask(tree, QUICK_STEPS);
    tell(id, quick);
    if (!quick.proven) unproven.push([tree, quick]);
  }
  for (const [tree, quick] of unproven) {
    const thorough = await ask(tree, THOROUGH_STEPS);
    tell(tree.circuit, sharper(quick, thorough));
  }
}

/** The shorter play with the higher bound: both bounds hold for every order of work. */
function sharper(quick: CircuitForecast, thorough: CircuitForecast): CircuitForecast {
  const better = thorough.expectedSeconds < quick.expectedSeconds + 1e-9 ? thorough : quick;
  const lowerBoundSeconds = Math.max(quick.lowerBoundSeconds, thorough.lowerBoundSeconds);
  return { ...better, lowerBoundSeconds };
}
