import type { Circuit, CircuitId, Harness, Part, PartId, Run, RunId } from './harness';

/** A plan's things by id. Maps, so that no id can be mistaken for a property of an object. */
export interface HarnessIndex {
  circuitById: ReadonlyMap<CircuitId, Circuit>;
  partById: ReadonlyMap<PartId, Part>;
  runById: ReadonlyMap<RunId, Run>;
}

/** Builds the lookups of one plan; O(circuits + parts + runs). Keep the result rather than build it again. */
export function indexHarness(harness: Harness): HarnessIndex {
  return {
    circuitById: byId(harness.circuits),
    partById: byId(harness.parts),
    runById: byId(harness.runs),
  };
}

function byId<Item extends { id: string }>(items: readonly Item[]): Map<string, Item> {
  return new Map(items.map((item) => [item.id, item]));
}
