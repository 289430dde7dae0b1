import { appendTo } from '../appendTo';
import type { Edge } from './wiring';

/** One circuit's runs, by either end. */
export interface Graph {
  /** Each part that the runs name, in the order in which they name it. */
  parts: ReadonlySet<string>;
  out: ReadonlyMap<string, Edge[]>;
  feeds: ReadonlyMap<string, Edge[]>;
}

export function graphOf(edges: readonly Edge[]): Graph {
  const parts = new Set<string>();
  const out = new Map<string, Edge[]>();
  const feeds = new Map<string, Edge[]>();
  for (const edge of edges) {
    parts.add(edge.from).add(edge.to);
    appendTo(out, edge.from, edge);
    appendTo(feeds, edge.to, edge);
  }
  return { parts, out, feeds };
}

/** The parts that power at `start` reaches and that `reached` does not hold yet; adds them to it. */
export function reach(graph: Graph, start: string, reached: Set<string>): string[] {
  const found: string[] = [];
  const ahead = [start];
  for (let part = ahead.pop(); part !== undefined; part = ahead.pop()) {
    if (reached.has(part)) continue;
    reached.add(part);
    found.push(part);
    for (const edge of (graph.out.get(part) ?? []).toReversed()) ahead.push(edge.to);
  }
  return found;
}
