import {
  circuitTree,
  type CircuitId,
  type Conductor,
  type Harness,
  type Part,
  type PartId,
  type PlaceRef,
  type RunId,
} from '@lampwright/harness';

/** A spot on the harness: a place, and for a run how far along it, from 0 at the feed side to 1; 0.5 where left out. */
export interface Spot {
  place: PlaceRef;
  fraction?: number;
}

/** A joint of wires. Numbered from 0, the inlet. */
export type Terminal = number;

/** A piece of a run between two terminals, or the closed contacts of a separable point (`run` is `null`). */
export interface Piece {
  feed: Terminal;
  load: Terminal;
  run: RunId | null;
  /** Where the piece starts and ends, as fractions of the run from its feed side. */
  start: number;
  end: number;
  metres: number;
  conductor?: Conductor;
}

/** Where a part is wired. The two sides are one terminal where the part cannot be opened. */
export interface Joint {
  near: Terminal;
  /** Beyond the part's own contacts. */
  far: Terminal;
  /** What the part as a whole stands for: a plug's near side, the far side of a lamp or module. */
  whole: Terminal;
}

/** One circuit as a graph of terminals, without any figure of resistance in it. */
export interface Wiring {
  terminals: number;
  jointOf: ReadonlyMap<PartId, Joint>;
  /** The parts, by the terminal that their loads hang on. */
  parts: readonly { part: Part; terminal: Terminal }[];
  pieces: readonly Piece[];
  /** The terminal of each spot asked for, in their order. */
  spots: readonly Terminal[];
}

/** The spot is on no part and no run of the circuit, or its fraction is not between 0 and 1. */
export class UnknownSpotError extends RangeError {
  override readonly name = 'UnknownSpotError';

  constructor(readonly spot: Spot) {
    super(`The circuit has no place ${JSON.stringify(spot)}.`);
  }
}

/**
 * Reads the circuit's wires. Runs go on from a plug's far side, but from a lamp's or module's near side: unplugging one
 * takes away itself alone. A run with spots in it is cut into pieces there. Points in `open` have no contacts.
 * O(parts + runs).
 *
 * @throws UnknownCircuitError
 * @throws UnknownSpotError
 */
export function wiringOf(
  harness: Harness,
  circuit: CircuitId,
  open: ReadonlySet<PartId> = new Set(),
  spots: readonly Spot[] = [],
): Wiring {
  const builder = new WiringBuilder(open, spots);
  for (const { part, feed } of circuitTree(harness, circuit).nodes) {
    const near = builder.addTerminal();
    builder.addPart(part, near);
    if (feed) builder.addRun(feed.id, feed.from, near, feed.metres, feed.conductor);
  }
  return builder.finish();
}

class WiringBuilder {
  private terminals = 0;
  private readonly jointOf = new Map<PartId, Joint>();
  private readonly onwardOf = new Map<PartId, Terminal>();
  private readonly parts: { part: Part; terminal: Terminal }[] = [];
  private readonly pieces: Piece[] = [];
  private readonly spotTerminals: (Terminal | undefined)[];
  private readonly spotsByRun = new Map<RunId, { at: number; fraction: number }[]>();

  constructor(
    private readonly open: ReadonlySet<PartId>,
    private readonly spots: readonly Spot[],
  ) {
    this.spotTerminals = spots.map(() => undefined);
    spots.forEach((spot, at) => {
      const { place, fraction = 0.5 } = spot;
      if (!(fraction >= 0 && fraction <= 1)) throw new UnknownSpotError(spot);
      if (place.kind !== 'run') return;
      this.spotsByRun.set(place.id, [...(this.spotsByRun.get(place.id) ?? []), { at, fraction }]);
    });
  }

  addTerminal(): Terminal {
    this.terminals += 1;
    return this.terminals - 1;
  }

  addPart(part: Part, near: Terminal): void {
    const far = part.separable ? this.addTerminal() : near;
    if (part.separable && !this.open.has(part.id)) {
      this.pieces.push({ feed: near, load: far, run: null, start: 0, end: 1, metres: 0 });
    }
    const plug = part.kind === 'plug';
    this.jointOf.set(part.id, { near, far, whole: plug ? near : far });
    this.onwardOf.set(part.id, plug ? far : near);
    this.parts.push({ part, terminal: far });
  }

  addRun(run: RunId, from: PartId, to: Terminal, metres: number, conductor?: Conductor): void {
    const cuts = (this.spotsByRun.get(run) ?? []).sort((a, b) => a.fraction - b.fraction);
    let feed = this.onwardOf.get(from) ?? 0;
    let start = 0;
    const add = (load: Terminal, end: number) => {
      const part = (end - start) * metres;
      this.pieces.push({
        feed,
        load,
        run,
        start,
        end,
        metres: part,
        ...(conductor && { conductor }),
      });
      feed = load;
      start = end;
    };
    for (const { at, fraction } of cuts) {
      const terminal = this.addTerminal();
      this.spotTerminals[at] = terminal;
      add(terminal, fraction);
    }
    add(to, 1);
  }

  finish(): Wiring {
    const { terminals, jointOf, parts, pieces } = this;
    const spots = this.spots.map((spot, at) => {
      const terminal = this.spotTerminals[at] ?? terminalOf(jointOf, spot.place);
      if (terminal === undefined) throw new UnknownSpotError(spot);
      return terminal;
    });
    return { terminals, jointOf, parts, pieces, spots };
  }
}

/** The terminal of a part's place; `undefined` for a run, or for a part that the circuit does not have. */
export function terminalOf(
  jointOf: ReadonlyMap<PartId, Joint>,
  place: PlaceRef,
): Terminal | undefined {
  if (place.kind === 'run') return undefined;
  const joint = jointOf.get(place.id);
  if (!place.half) return joint?.whole;
  return place.half === 'feed' ? joint?.near : joint?.far;
}
