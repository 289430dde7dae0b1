import type { CircuitId, PartId, RunId } from './harness';

/** A place that can hold the fault. A separable plug is two places: its feed half and its load half. */
export type PlaceRef =
  { kind: 'part'; id: PartId; half?: 'feed' | 'load' } | { kind: 'run'; id: RunId };

export interface Place {
  ref: PlaceRef;
  /** Relative weight, not negative. */
  weight: number;
}

/** A point that a person can open, with its times in seconds and its distance from the front in metres. */
export interface SeparablePoint {
  partId: PartId;
  openSeconds: number;
  closeSeconds: number;
  along: number;
}

/** A set of places that no opening tells apart. */
export interface Section {
  /** Position in `SectionTree.sections`; parents come before children, section 0 holds the inlet. */
  index: number;
  parent: number | null;
  /** The point whose opening parts this section from its parent; `null` for section 0. */
  point: SeparablePoint | null;
  children: number[];
  places: Place[];
  /** Sum of the weights of the places. */
  weight: number;
  /** `weight` divided by the sum over all sections; they sum to 1. */
  probability: number;
}

/** One circuit contracted into its sections. */
export interface SectionTree {
  circuit: CircuitId;
  sections: Section[];
}
