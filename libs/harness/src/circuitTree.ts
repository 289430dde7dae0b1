import { appendTo } from './appendTo';
import { UnknownCircuitError } from './errors';
import type { CircuitId, Harness, Part, PartId, Run } from './harness';

/** One part as it is wired on one circuit. */
export interface CircuitNode {
  part: Part;
  /** The run that feeds the part; `null` for the inlet. */
  feed: Run | null;
  /** The runs by which the part feeds others, in the order of the document. */
  runs: Run[];
}

/** What one circuit looks like from the inlet outwards. */
export interface CircuitTree {
  circuit: CircuitId;
  /** Feed first: a part comes after the part that feeds it, and a branch is told to its end before the next. */
  nodes: CircuitNode[];
  nodeByPart: ReadonlyMap<PartId, CircuitNode>;
}

/**
 * Walks one circuit from the inlet. Expects a plan that the reader accepts; of any other it gives a tree all the same,
 * without the parts it cannot reach and the runs that lead back or nowhere. O(parts + runs), without recursion.
 *
 * @throws UnknownCircuitError when the plan has no such circuit.
 */
export function circuitTree(harness: Harness, circuitId: CircuitId): CircuitTree {
  if (!harness.circuits.some((circuit) => circuit.id === circuitId)) {
    throw new UnknownCircuitError(circuitId);
  }
  const partById = new Map(harness.parts.map((part) => [part.id, part]));
  const runsFrom = runsByFeedSide(harness, circuitId);
  const nodeByPart = new Map<PartId, CircuitNode>();
  const inlet = harness.parts.find((part) => part.kind === 'inlet');
  const ahead: { part: Part; feed: Run | null }[] = inlet ? [{ part: inlet, feed: null }] : [];

  for (let next = ahead.pop(); next; next = ahead.pop()) {
    if (nodeByPart.has(next.part.id)) continue;
    nodeByPart.set(next.part.id, { ...next, runs: [] });
    if (next.feed) nodeByPart.get(next.feed.from)?.runs.push(next.feed);
    for (const run of (runsFrom.get(next.part.id) ?? []).toReversed()) {
      const part = partById.get(run.to);
      if (part) ahead.push({ part, feed: run });
    }
  }
  return { circuit: circuitId, nodes: [...nodeByPart.values()], nodeByPart };
}

function runsByFeedSide(harness: Harness, circuitId: CircuitId): Map<PartId, Run[]> {
  const runsFrom = new Map<PartId, Run[]>();
  for (const run of harness.runs) {
    if (run.circuits.includes(circuitId)) appendTo(runsFrom, run.from, run);
  }
  return runsFrom;
}
