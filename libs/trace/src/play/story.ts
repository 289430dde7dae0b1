import type { CircuitId, PartId, PlaceRef } from '@lampwright/harness';
import type { Planner } from '@lampwright/isolation';
import type { PartUsed } from '../events';
import type { Feed } from '../feed';

/** A short that a played trace is to find. */
export interface HiddenShort {
  circuit: CircuitId;
  place: PlaceRef;
  cause: string;
  correction: string;
  parts: PartUsed[];
}

/** What a played trace is about. */
export interface TraceStory {
  complaint: string;
  /** Circuits stated at intake. */
  circuits: CircuitId[];
  feed: Feed;
  shorts: readonly HiddenShort[];
  /** Lamps that stay dark at the lamp check. */
  dark?: readonly { lamp: PartId; note?: string }[];
  /** Who signs. */
  name: string;
}

/** How a trace is played. */
export interface PlayOptions {
  /** Whose advice is followed; by default the program's own planner. */
  choose?: Planner;
  /** Probability that an energised short shows in one power-up. Default 1. */
  detection?: number;
  /** For shorts that do not always show. Default 1. */
  seed?: number;
  /** Default `played`. */
  device?: string;
  /** Seconds between two events. Default 20. */
  secondsPerEvent?: number;
}
