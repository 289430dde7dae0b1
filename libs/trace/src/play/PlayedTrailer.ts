import { energisedSections, type CircuitId, type PartId, type PlaceRef } from '@lampwright/harness';
import { benchTree } from '../bench';
import { samePlace, sectionsOf } from '../places';
import type { TraceContext } from '../state';
import { chance } from './chance';
import type { HiddenShort } from './story';

/** The trailer that a played trace is worked on: it has the shorts that are hidden in it until they are repaired. */
export class PlayedTrailer {
  private readonly next: () => number;

  constructor(
    private readonly shorts: readonly HiddenShort[],
    private readonly detection: number,
    seed: number,
  ) {
    this.next = chance(seed);
  }

  /** What power on a circuit shows with these points open. */
  power(context: TraceContext, circuit: CircuitId, open: readonly PartId[]): 'overload' | 'holds' {
    const tree = benchTree(context.record.plan.harness, circuit);
    const energised = energisedSections(tree, open);
    const isShort = this.left(context, circuit).some(({ place }) =>
      sectionsOf(tree, place).some((section) => energised[section]),
    );
    return isShort && (this.detection >= 1 || this.next() < this.detection) ? 'overload' : 'holds';
  }

  /** The short at a place, if one is there. */
  shortAt(context: TraceContext, circuit: CircuitId, place: PlaceRef): HiddenShort | undefined {
    return this.left(context, circuit).find((short) => samePlace(short.place, place));
  }

  /** The shorts of a circuit that are not repaired yet. */
  left(context: TraceContext, circuit: CircuitId): HiddenShort[] {
    return this.shorts.filter(
      (short) =>
        short.circuit === circuit &&
        !context.repairs.some(({ place }) => samePlace(place, short.place)),
    );
  }
}
