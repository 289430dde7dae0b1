import type { Part, PartId, Run } from '@lampwright/harness';
import { WIRES } from './circuits';
import type { Wire } from './circuits';
import type { Node } from './nodes';

/** A harness never lies along the straight line: a twentieth of slack. */
const SLACK = 1.05;

/** The runs of a plan: from each load back to the inlet, circuit by circuit. One run joins two parts, for all its circuits. */
export function runsOf(parts: readonly Part[], nodes: ReadonlyMap<PartId, Node>): Run[] {
  const byId = new Map(parts.map((part) => [part.id, part]));
  const carried = new Map<PartId, Map<PartId, Set<Wire>>>();

  const climb = (start: PartId, wire: Wire) => {
    for (let id = start, node = nodes.get(id); node; node = nodes.get(id)) {
      const feeder = feederOf(node, wire);
      const feeders = carried.get(id) ?? new Map<PartId, Set<Wire>>();
      carried.set(id, feeders.set(feeder, (feeders.get(feeder) ?? new Set()).add(wire)));
      id = feeder;
    }
  };
  for (const { id, ends } of nodes.values()) ends?.forEach((wire) => climb(id, wire));
  for (const part of parts) {
    for (const load of (part.lamp ?? part.module)?.loads ?? [])
      climb(part.id, load.circuit as Wire);
  }

  return [...nodes.values()].flatMap((node) =>
    [...(carried.get(node.id) ?? [])].map(([from, wires], index) => ({
      id: index === 0 ? `run-${node.id}` : `run-${node.id}-${index + 1}`,
      from,
      to: node.id,
      circuits: WIRES.filter((wire) => wires.has(wire)),
      metres: node.metres ?? length(byId.get(from), byId.get(node.id)),
      conductor: { awg: node.awg ?? (byId.get(node.id)?.kind === 'lamp' ? 16 : 14) },
    })),
  );
}

function feederOf(node: Node, wire: Wire): PartId {
  const feeder = typeof node.from === 'string' ? node.from : node.from[wire];
  if (feeder === undefined) throw new Error(`${node.id} has no feed for ${wire}`);
  return feeder;
}

/** Metres along, across and up between two parts, with slack, to the tenth above. */
function length(from: Part | undefined, to: Part | undefined): number {
  if (!from || !to) throw new Error('a run needs two parts');
  const way =
    Math.abs(to.at.along - from.at.along) +
    Math.abs(to.at.across - from.at.across) +
    Math.abs((to.at.up ?? 0) - (from.at.up ?? 0));
  return Math.max(0.2, Math.ceil(Number((way * SLACK * 10).toFixed(6))) / 10);
}
