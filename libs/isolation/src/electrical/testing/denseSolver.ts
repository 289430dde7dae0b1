import type { ResistorTree, Source } from '../resistorTree';

/**
 * Node voltages by the nodal matrix and Gaussian elimination with pivots: another way to the same answer, which knows
 * nothing of trees. The ideal source is a current behind its ohms, so those must be more than 0, as must every branch.
 */
export function denseVolts(tree: ResistorTree, source: Source): number[] {
  const n = tree.parent.length;
  const rows = Array.from({ length: n }, () => Array.from({ length: n + 1 }, () => 0));
  const add = (row: number, column: number, value: number) => {
    rows[row]![column]! += value;
  };
  tree.parent.forEach((up, node) => {
    add(node, node, tree.siemens[node]!);
    if (up < 0) {
      add(node, node, 1 / source.ohms);
      add(node, n, source.volts / source.ohms);
      return;
    }
    const branch = 1 / tree.ohms[node]!;
    add(node, node, branch);
    add(up, up, branch);
    add(node, up, -branch);
    add(up, node, -branch);
  });
  return eliminate(rows);
}

function eliminate(rows: number[][]): number[] {
  const n = rows.length;
  for (let column = 0; column < n; column += 1) {
    let pivot = column;
    for (let row = column; row < n; row += 1) {
      if (Math.abs(rows[row]![column]!) > Math.abs(rows[pivot]![column]!)) pivot = row;
    }
    [rows[column], rows[pivot]] = [rows[pivot]!, rows[column]!];
    for (let row = column + 1; row < n; row += 1) {
      const factor = rows[row]![column]! / rows[column]![column]!;
      for (let at = column; at <= n; at += 1) rows[row]![at]! -= factor * rows[column]![at]!;
    }
  }
  const solution = Array.from({ length: n }, () => 0);
  for (let row = n - 1; row >= 0; row -= 1) {
    let rest = rows[row]![n]!;
    for (let at = row + 1; at < n; at += 1) rest -= rows[row]![at]! * solution[at]!;
    solution[row] = rest / rows[row]![row]!;
  }
  return solution;
}
