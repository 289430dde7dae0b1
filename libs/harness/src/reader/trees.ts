import type { FaultList } from './faultList';
import { graphOf, reach, type Graph } from './graph';
import { findLoops, type Loop } from './loops';
import type { Edge, Wiring } from './wiring';

/**
 * Judges that on each circuit the runs form one tree rooted at the inlet. Each mistake gives one fault: a part that a
 * loop feeds is not also called fed twice, and what hangs on an unreachable part is listed with it.
 */
export function judgeTrees(wiring: Wiring, faults: FaultList): void {
  for (const [circuit, edges] of wiring.edges) {
    if (faults.full) return;
    const graph = graphOf(edges);
    const inlets = [...graph.parts].filter((part) => wiring.partById.get(part)?.kind === 'inlet');
    const loops = findLoops(graph, inlets);
    addLoops(loops, circuit, faults);
    addSecondFeeds(graph, loops, circuit, wiring, faults);
    if (wiring.hasInlet && !wiring.incomplete(circuit)) {
      addUnreachable(graph, loops, inlets, circuit, wiring, faults);
    }
  }
}

function addLoops(loops: readonly Loop[], circuit: string, faults: FaultList): void {
  for (const { closing, length, parts } of loops) {
    const id = closing.run === undefined ? undefined : { id: closing.run };
    faults.add({ code: 'loop', path: closing.path, ...id, circuit, found: length, others: parts });
  }
}

function addSecondFeeds(
  graph: Graph,
  loops: readonly Loop[],
  circuit: string,
  wiring: Wiring,
  faults: FaultList,
): void {
  const closing = new Set<Edge>(loops.map((loop) => loop.closing));
  for (const [id, edges] of graph.feeds) {
    const feeds = edges.filter((edge) => !closing.has(edge));
    if (feeds.length < 2) continue;
    const others = feeds.map((edge) => edge.run).filter((run) => run !== undefined);
    const path = pathOf(wiring, id);
    faults.add({ code: 'twoFeeds', path, id, circuit, found: feeds.length, wanted: 1, others });
  }
}

function addUnreachable(
  graph: Graph,
  loops: readonly Loop[],
  inlets: readonly string[],
  circuit: string,
  wiring: Wiring,
  faults: FaultList,
): void {
  const reached = new Set<string>();
  for (const start of [...inlets, ...loops.map((loop) => loop.closing.to)]) {
    reach(graph, start, reached);
  }
  for (const id of graph.parts) {
    if (reached.has(id) || graph.feeds.has(id)) continue;
    const [, ...others] = reach(graph, id, reached);
    const path = pathOf(wiring, id);
    faults.add({ code: 'unreachable', path, id, circuit, found: others.length + 1, others });
  }
}

function pathOf(wiring: Wiring, part: string): string {
  return wiring.partById.get(part)?.path ?? 'parts';
}
