import fc from 'fast-check';
import { portAt, shortAmps, sourceAmps } from './port';
import { solveTree, type ResistorTree } from './resistorTree';
import { arbitrarySource, arbitraryTree } from './testing/arbitraryTree';
import { denseVolts } from './testing/denseSolver';

const close = (a: number, b: number, relative = 1e-9, scale = 0) =>
  Math.abs(a - b) <= relative * Math.max(Math.abs(a), Math.abs(b), scale);

const withLeak = (tree: ResistorTree, node: number, siemens: number): ResistorTree => ({
  ...tree,
  siemens: tree.siemens.map((value, at) => (at === node ? value + siemens : value)),
});

const arbitraryCircuit = fc.record({
  tree: arbitraryTree,
  source: arbitrarySource,
  pick: fc.nat(),
});

describe('solveTree', () => {
  it('solves series and parallel resistors: 24 V on (100 || 250) + (350 || 200) ohm', () => {
    // A textbook's figures, from memory, and recomputed by another program.
    const parallel = (a: number, b: number) => 1 / (1 / a + 1 / b);
    const tree = {
      parent: [-1, 0, 1, 1],
      ohms: [0, parallel(100, 250), 0, 0],
      siemens: [0, 0, 1 / 350, 1 / 200],
    };
    const { volts, amps } = solveTree(tree, { volts: 24, ohms: 0 });
    expect(amps[0]! * 1000).toBeCloseTo(120.78, 2);
    expect(24 / amps[0]!).toBeCloseTo(198.7, 2);
    expect(24 - volts[1]!).toBeCloseTo(8.6275, 4);
    expect(volts[1]).toBeCloseTo(15.373, 3);
    expect((24 - volts[1]!) / 0.1).toBeCloseTo(86.275, 3);
    expect((24 - volts[1]!) / 0.25).toBeCloseTo(34.51, 3);
    expect(amps[2]! * 1000).toBeCloseTo(43.922, 3);
    expect(amps[3]! * 1000).toBeCloseTo(76.863, 3);
  });

  it('agrees with Gaussian elimination on any tree', () => {
    fc.assert(
      fc.property(arbitraryCircuit, ({ tree, source }) => {
        const dense = denseVolts(tree, source);
        const { volts } = solveTree(tree, source);
        return volts.every((value, node) => close(value, dense[node]!, 1e-9, source.volts));
      }),
      { numRuns: 500 },
    );
  });

  it("keeps Kirchhoff's law at every node and Ohm's in every branch", () => {
    fc.assert(
      fc.property(arbitraryCircuit, ({ tree, source }) => {
        const { volts, amps } = solveTree(tree, source);
        const leaving = volts.map((value, node) => value * tree.siemens[node]!);
        tree.parent.forEach((up, node) => {
          if (up >= 0) leaving[up]! += amps[node]!;
        });
        return tree.parent.every((up, node) => {
          const before = up < 0 ? source.volts : volts[up]!;
          const ohms = up < 0 ? source.ohms : tree.ohms[node]!;
          return (
            close(amps[node]!, leaving[node]!) &&
            close(before - volts[node]!, ohms * amps[node]!, 1e-9, source.volts)
          );
        });
      }),
    );
  });

  it('turns into heat what the source gives', () => {
    fc.assert(
      fc.property(arbitraryCircuit, ({ tree, source }) => {
        const { volts, amps } = solveTree(tree, source);
        const heat = tree.parent.reduce((sum, up, node) => {
          const ohms = up < 0 ? source.ohms : tree.ohms[node]!;
          return sum + ohms * amps[node]! ** 2 + tree.siemens[node]! * volts[node]! ** 2;
        }, 0);
        return close(heat, source.volts * amps[0]!);
      }),
    );
  });

  it('draws more, and has less voltage everywhere, the better anything leaks', () => {
    fc.assert(
      fc.property(arbitraryCircuit, ({ tree, source, pick }) => {
        const node = pick % tree.parent.length;
        const before = solveTree(tree, source);
        const after = solveTree(withLeak(tree, node, 0.5), source);
        return (
          after.amps[0]! >= before.amps[0]! * (1 - 1e-12) &&
          after.volts.every((value, at) => value <= before.volts[at]! * (1 + 1e-12))
        );
      }),
    );
  });
});

describe('a port', () => {
  // 12 V behind 1 ohm, 2 ohm on to a node with 6 ohm to ground.
  const tree = { parent: [-1, 0], ohms: [0, 2], siemens: [0, 1 / 6] };
  const solution = solveTree(tree, { volts: 12, ohms: 1 });

  it('is what Thévenin gives by hand', () => {
    // At the node: 12 × 6 / 9 = 8 V behind 3 || 6 = 2 ohm. Half way along: 12 × 7 / 9 V behind 2 || 7 ohm.
    const end = portAt(tree, solution, 1);
    expect(end.volts).toBeCloseTo(8, 12);
    expect(end.ohms).toBeCloseTo(2, 12);
    const middle = portAt(tree, solution, 1, 0.5);
    expect(middle.volts).toBeCloseTo(28 / 3, 12);
    expect(middle.ohms).toBeCloseTo(14 / 9, 12);
  });

  it('tells the amps of a short without solving again', () => {
    // 2 ohm at the node: 8 V on 4 ohm; then 12 V on 1 + 2 + (6 || 2) ohm in all.
    const end = portAt(tree, solution, 1);
    expect(shortAmps(end, 2)).toBeCloseTo(2, 12);
    expect(sourceAmps(solution, end, 2)).toBeCloseTo(12 / 4.5, 12);
  });

  it('agrees with solving the tree that has the short in it, wherever it is', () => {
    const shorts = fc.record({
      circuit: arbitraryCircuit,
      ohms: fc.constantFrom(0.001, 0.1, 5),
      share: fc.constantFrom(0, 0.25, 0.9, 1),
    });
    fc.assert(
      fc.property(shorts, ({ circuit: { tree, source, pick }, ohms, share }) => {
        const node = pick % tree.parent.length;
        const port = portAt(tree, solveTree(tree, source), node, share);
        const cut = node === 0 ? withLeak(tree, 0, 1 / ohms) : cutAt(tree, node, share, 1 / ohms);
        const after = solveTree(cut, source);
        return (
          close(sourceAmps(solveTree(tree, source), port, ohms), after.amps[0]!) &&
          close(shortAmps(port, ohms), after.volts[node]! / ohms)
        );
      }),
      { numRuns: 500 },
    );
  });
});

/** The tree with its branch to `node` cut in two, and a leak at the cut; the cut gets the node's number. */
function cutAt(tree: ResistorTree, node: number, share: number, siemens: number): ResistorTree {
  const moved = (at: number) => (at >= node ? at + 1 : at);
  const insert = (values: readonly number[], ...there: number[]) => [
    ...values.slice(0, node),
    ...there,
    ...values.slice(node + 1),
  ];
  const branch = tree.ohms[node]!;
  const parent = tree.parent.map((up) => (up < 0 ? up : moved(up)));
  return {
    parent: insert(parent, parent[node]!, node),
    ohms: insert(tree.ohms, share * branch, (1 - share) * branch),
    siemens: insert(tree.siemens, siemens, tree.siemens[node]!),
  };
}
