import type { ResistorTree, TreeSolution } from './resistorTree';

/** A place looked at from outside: its voltage while nothing is shorted there, and the ohms behind it (Thévenin). */
export interface Port {
  volts: number;
  ohms: number;
}

/**
 * The port in the middle of the branch that feeds `node`, `share` of the way from its parent (0) to the node (1); at 1
 * it is the node's own. O(1).
 */
export function portAt(tree: ResistorTree, solution: TreeSolution, node: number, share = 1): Port {
  const { volts, throughOhms, onward } = solution;
  if (node === 0 || share === 1) return { volts: volts[node] ?? 0, ohms: throughOhms[node] ?? 0 };
  const parent = tree.parent[node] ?? 0;
  const branch = tree.ohms[node] ?? 0;
  const before = share * branch;
  const beyond = 1 / ((1 - share) * branch + 1 / (onward[node] ?? 0));
  const transfer = 1 / (1 + before * beyond);
  return {
    volts: transfer * (volts[parent] ?? 0),
    ohms: transfer * (before + transfer * (throughOhms[parent] ?? 0)),
  };
}

/** Amps through a short of `ohms` at the port. O(1). */
export function shortAmps(port: Port, ohms: number): number {
  return port.volts / (port.ohms + ohms);
}

/**
 * Amps that the source gives while a short of `ohms` is at the port. The short adds its own amps times the port's share
 * of the source's voltage: by reciprocity a current drawn there reaches the source in that share. O(1).
 */
export function sourceAmps(solution: TreeSolution, port: Port, ohms: number): number {
  const alone = solution.amps[0] ?? 0;
  return alone + shortAmps(port, ohms) * (port.volts / solution.source.volts);
}
