import type { Part, Run } from '@lampwright/harness';
import type { ShownHarness } from './layout/shown-circuit';

export interface PartNode {
  part: Part;
  /** The wire that leads here; `null` for the inlet and for parts of other circuits. */
  run: Run | null;
  /** Position in the drawing's order, from 1: the number a part has where its label does not fit. */
  number: number;
  children: PartNode[];
}

/** The parts as they hang on one another, from the inlet outwards. O(parts + runs). */
export function partTree({ parts, runs }: Pick<ShownHarness, 'parts' | 'runs'>): PartNode[] {
  const nodes = new Map(
    parts.map((part, at): [string, PartNode] => [
      part.id,
      { part, run: null, number: at + 1, children: [] },
    ]),
  );
  for (const run of runs) {
    const child = nodes.get(run.to);
    // A part that several wires feed hangs on the first.
    if (!child || child.run) continue;
    child.run = run;
    nodes.get(run.from)?.children.push(child);
  }
  return [...nodes.values()].filter((node) => !node.run);
}
