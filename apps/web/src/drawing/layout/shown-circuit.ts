import type { CircuitId, Harness, Part, PartId, Run } from '@lampwright/harness';

export interface ShownHarness {
  /** The parts that are drawn in full, feed first. */
  parts: Part[];
  /** Their runs, feed first. */
  runs: Run[];
  /** Parts of other circuits, drawn as faint dots. */
  others: Part[];
}

/**
 * What one circuit shows (`null`: all of them), in the order of the wires from the inlet. Parts in `keep`, such as
 * points of another circuit that stand open, are shown as well. O(parts + runs).
 */
export function shownHarness(
  harness: Harness,
  circuit: CircuitId | null,
  keep: ReadonlySet<PartId>,
): ShownHarness {
  const runs = harness.runs.filter((run) => circuit === null || run.circuits.includes(circuit));
  const partById = new Map(harness.parts.map((part) => [part.id, part]));
  const runsFrom = new Map<PartId, Run[]>();
  for (const run of runs) runsFrom.set(run.from, [...(runsFrom.get(run.from) ?? []), run]);

  const seen = new Set<PartId>();
  const ordered: { parts: Part[]; runs: Run[] } = { parts: [], runs: [] };
  const ahead = harness.parts.filter((part) => part.kind === 'inlet').reverse();
  for (let part = ahead.pop(); part; part = ahead.pop()) {
    if (seen.has(part.id)) continue;
    seen.add(part.id);
    ordered.parts.push(part);
    for (const run of (runsFrom.get(part.id) ?? []).toReversed()) {
      const next = partById.get(run.to);
      if (next) ahead.push(next);
    }
  }
  const rank = new Map(ordered.parts.map((part, at) => [part.id, at]));
  ordered.runs = runs
    .filter((run) => rank.has(run.from) && rank.has(run.to))
    .sort((a, b) => (rank.get(a.to) ?? 0) - (rank.get(b.to) ?? 0));

  const rest = harness.parts.filter((part) => !seen.has(part.id));
  const extra = rest.filter((part) => circuit === null || keep.has(part.id));
  return {
    parts: [...ordered.parts, ...extra],
    runs: ordered.runs,
    others: rest.filter((part) => !extra.includes(part)),
  };
}
