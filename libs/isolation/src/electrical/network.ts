import type { Conductor, Part, RunId } from '@lampwright/harness';
import type { ResistorTree } from './resistorTree';
import type { Piece, Terminal, Wiring } from './wiring';

/** Gives the wires and loads their figures. */
export interface NetworkModel {
  /** Of a run's conductor; `undefined` where the plan does not say. */
  ohmsPerMetre(conductor: Conductor | undefined): number;
  /** What the part's load passes to ground; 0 for one that draws nothing. */
  siemens(part: Part): number;
}

/** A piece of a run as it lies in the tree. */
interface Branch {
  piece: Piece;
  /** The node it feeds, seen from the root. */
  node: number;
  /** Whether that node is the piece's load side; seen from the inlet it always is. */
  forward: boolean;
}

/** The part of a circuit that is connected to one terminal, as a tree with that terminal at its root. */
export interface Network {
  tree: ResistorTree;
  /** By terminal: its node; absent where nothing connects it to the root. */
  nodeAt: ReadonlyMap<Terminal, number>;
  /** By node: metres of conductor from the root. */
  metres: readonly number[];
  /** The pieces of each run that is reached. */
  branchesOf: ReadonlyMap<RunId, readonly Branch[]>;
}

/**
 * Looks at the wiring from one terminal: from the inlet, as the supply does, or from an opened point, as a meter does.
 * `extra` adds siemens to ground at some terminals. O(terminals + pieces), without recursion.
 */
export function networkFrom(
  wiring: Wiring,
  root: Terminal,
  model: NetworkModel,
  extra: readonly { terminal: Terminal; siemens: number }[] = [],
): Network {
  const leaving = piecesByTerminal(wiring);
  const siemensAt = siemensByTerminal(wiring, model, extra);
  const parent: number[] = [];
  const ohms: number[] = [];
  const siemens: number[] = [];
  const metres: number[] = [];
  const nodeAt = new Map<Terminal, number>();
  const branchesOf = new Map<RunId, Branch[]>();
  const ahead: { terminal: Terminal; from: number; piece?: Piece }[] = [
    { terminal: root, from: -1 },
  ];

  for (let next = ahead.pop(); next; next = ahead.pop()) {
    const { terminal, from, piece } = next;
    const node = parent.push(from) - 1;
    nodeAt.set(terminal, node);
    metres.push((metres[from] ?? 0) + (piece?.metres ?? 0));
    siemens.push(siemensAt[terminal] ?? 0);
    ohms.push(piece?.run ? piece.metres * model.ohmsPerMetre(piece.conductor) : 0);
    if (piece?.run) {
      const branches = branchesOf.get(piece.run) ?? [];
      branchesOf.set(piece.run, branches);
      branches.push({ piece, node, forward: piece.load === terminal });
    }
    for (const other of leaving[terminal] ?? []) {
      if (other === piece) continue;
      ahead.push({
        terminal: other.feed === terminal ? other.load : other.feed,
        from: node,
        piece: other,
      });
    }
  }
  return { tree: { parent, ohms, siemens }, nodeAt, metres, branchesOf };
}

function piecesByTerminal(wiring: Wiring): Piece[][] {
  const leaving: Piece[][] = Array.from({ length: wiring.terminals }, () => []);
  for (const piece of wiring.pieces) {
    leaving[piece.feed]?.push(piece);
    leaving[piece.load]?.push(piece);
  }
  return leaving;
}

function siemensByTerminal(
  { terminals, parts }: Wiring,
  model: NetworkModel,
  extra: readonly { terminal: Terminal; siemens: number }[],
): number[] {
  const sums = Array.from({ length: terminals }, () => 0);
  for (const { part, terminal } of parts)
    sums[terminal] = (sums[terminal] ?? 0) + model.siemens(part);
  for (const { terminal, siemens } of extra) sums[terminal] = (sums[terminal] ?? 0) + siemens;
  return sums;
}
