import type { Network } from './network';
import { terminalOf, type Spot, type Wiring } from './wiring';

/** Where a spot lies in a network: in the branch that feeds `node`, `share` of the way to it. */
export interface Location {
  node: number;
  share: number;
  /** Of conductor, from the root. */
  metres: number;
}

/** Finds a spot; `undefined` where the network does not reach it. O(pieces of the run). */
export function locate(wiring: Wiring, network: Network, spot: Spot): Location | undefined {
  const { place, fraction = 0.5 } = spot;
  if (place.kind === 'part') {
    const terminal = terminalOf(wiring.jointOf, place);
    const node = terminal === undefined ? undefined : network.nodeAt.get(terminal);
    if (node === undefined) return undefined;
    return { node, share: 1, metres: network.metres[node] ?? 0 };
  }
  const branch = network.branchesOf
    .get(place.id)
    ?.find(({ piece }) => piece.start <= fraction && fraction <= piece.end);
  if (!branch) return undefined;
  const { piece, node, forward } = branch;
  const length = piece.end - piece.start;
  const passed = length > 0 ? (fraction - piece.start) / length : 1;
  const share = forward ? passed : 1 - passed;
  return { node, share, metres: (network.metres[node] ?? 0) - (1 - share) * piece.metres };
}
