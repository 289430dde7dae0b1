import type { Part, PartId, Run } from '@lampwright/harness';

export interface Connected {
  parts: ReadonlySet<PartId>;
  runs: ReadonlySet<string>;
}

/**
 * What is still wired to the inlet while `open` is open: an open plug parts all that follows it, an open lamp or module
 * only itself. Expects runs feed first. O(parts + runs).
 */
export function connectedParts(
  parts: readonly Part[],
  runs: readonly Run[],
  open: readonly PartId[],
): Connected {
  const parted = new Set(open);
  const partById = new Map(parts.map((part) => [part.id, part]));
  const live = new Set(parts.filter((part) => part.kind === 'inlet').map((part) => part.id));
  const liveRuns = new Set<string>();
  for (const run of runs) {
    const feed = partById.get(run.from);
    if (!live.has(run.from) || (feed?.kind === 'plug' && parted.has(run.from))) continue;
    liveRuns.add(run.id);
    live.add(run.to);
  }
  return { parts: live, runs: liveRuns };
}
