/**
 * A tree of resistances fed at its root. Nodes are numbered from 0, the root, and each comes after its parent; ground
 * is no node.
 */
export interface ResistorTree {
  /** By node: the node that feeds it; -1 for the root. */
  parent: readonly number[];
  /** By node: ohms of the branch that feeds it, 0 or more; the root's is not looked at. */
  ohms: readonly number[];
  /** By node: siemens from the node straight to ground, 0 or more and finite. */
  siemens: readonly number[];
}

/** What feeds the root: an ideal voltage with ohms in series, the way back from ground included. */
export interface Source {
  volts: number;
  ohms: number;
}

/** The state of every node, by node number. Volts are measured to the tree's own ground. */
export interface TreeSolution {
  source: Source;
  volts: number[];
  /** Amps in the branch that feeds the node; the root's are those of the source. */
  amps: number[];
  /** Siemens from the node to ground through itself and all it feeds: what a meter there sees looking onward. */
  onward: number[];
  /** Ohms that a short at the node would see: the whole tree and the source's ohms, looked at from there. */
  throughOhms: number[];
}

/**
 * Solves the tree in one pass up and one down, without a matrix. O(nodes), no recursion.
 *
 * Up: a branch of R ohms into a node of G siemens counts 1 / (R + 1 / G) at its parent. Down: the node's voltage is its
 * parent's times t = 1 / (1 + R G), and its Thévenin resistance is t R + t² times its parent's, which needs no
 * subtraction and so loses no digits.
 */
export function solveTree(tree: ResistorTree, source: Source): TreeSolution {
  const { parent } = tree;
  const onward = [...tree.siemens];
  for (let node = parent.length - 1; node > 0; node -= 1) {
    const up = parent[node] ?? 0;
    onward[up] = (onward[up] ?? 0) + 1 / ((tree.ohms[node] ?? 0) + 1 / (onward[node] ?? 0));
  }

  const volts: number[] = [];
  const throughOhms: number[] = [];
  parent.forEach((up, node) => {
    const ohms = node === 0 ? source.ohms : (tree.ohms[node] ?? 0);
    const transfer = 1 / (1 + ohms * (onward[node] ?? 0));
    volts.push(transfer * (node === 0 ? source.volts : (volts[up] ?? 0)));
    throughOhms.push(transfer * (ohms + transfer * (node === 0 ? 0 : (throughOhms[up] ?? 0))));
  });
  const amps = volts.map((value, node) => value * (onward[node] ?? 0));
  return { source, volts, amps, onward, throughOhms };
}
