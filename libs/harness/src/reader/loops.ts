import { OTHERS_SHOWN } from '../faults';
import type { Graph } from './graph';
import type { Edge } from './wiring';

/** A run that leads back to a part which feeds it, and what lies on the way round. */
export interface Loop {
  closing: Edge;
  /** How many parts the loop has. */
  length: number;
  /** The first of them, as many as are shown. */
  parts: string[];
}

/**
 * The runs without which the circuit would have no loop, found by walking it from the inlets, then from parts that
 * nothing feeds, then from whatever is left. O(parts + runs), without recursion.
 */
export function findLoops(graph: Graph, inlets: readonly string[]): Loop[] {
  const loops: Loop[] = [];
  const unfed = [...graph.parts].filter((part) => !graph.feeds.has(part));
  const seen = new Set<string>();
  for (const start of [...inlets, ...unfed, ...graph.parts]) {
    if (!seen.has(start)) walk(graph, start, seen, loops);
  }
  return loops;
}

function walk(graph: Graph, start: string, seen: Set<string>, loops: Loop[]): void {
  const way: { part: string; next: number }[] = [];
  const depth = new Map<string, number>();
  const enter = (part: string): void => {
    seen.add(part);
    depth.set(part, way.length);
    way.push({ part, next: 0 });
  };

  enter(start);
  for (let step = way.at(-1); step; step = way.at(-1)) {
    const edge = graph.out.get(step.part)?.[step.next++];
    if (!edge) {
      depth.delete(step.part);
      way.pop();
      continue;
    }
    const back = depth.get(edge.to);
    if (back !== undefined) {
      const parts = way.slice(back, back + OTHERS_SHOWN).map(({ part }) => part);
      loops.push({ closing: edge, length: way.length - back, parts });
    } else if (!seen.has(edge.to)) enter(edge.to);
  }
}
