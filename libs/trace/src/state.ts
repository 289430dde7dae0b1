import type { CircuitId, PartId, PlaceRef } from '@lampwright/harness';
import type { BarReason, CautionId, LampResult, PartUsed, Seen } from './events';
import type { Feed } from './feed';
import type { TraceRecord } from './record';

/** The steps a person sees; `design` numbers them 1 to 10. */
export type Step =
  | 'intake'
  | 'makeSafe'
  | 'confirm'
  | 'narrow'
  | 'inspect'
  | 'repair'
  | 'prove'
  | 'reconnect'
  | 'lampCheck'
  | 'sign'
  | 'signed'
  | 'abandoned';

/** One power-up of the narrowing, or a proof, as the fold keeps it. */
export interface PowerUp {
  eventId: string;
  at: string;
  circuit: CircuitId;
  open: PartId[];
  seen: Seen;
  amps?: number;
  advised?: PartId[];
  /** Counts the shorts: 1 for the first hunt, 2 after a repair that did not clear the overload. */
  hunt: number;
  /** False once a person said that what came before no longer counts (the plan was wrong). */
  counts: boolean;
}

export type ContradictionKind =
  /** It holds with everything connected. */
  | 'holdsAllConnected'
  /** It overloads, and nothing that was energised is still in question. */
  | 'nothingLeft'
  /** Every place of the section was looked at and is clear. */
  | 'sectionClear';

export interface Repair {
  place: PlaceRef;
  cause: string;
  correction: string;
  parts: PartUsed[];
  note?: string;
}

/** The context of the trace machine: plain JSON, computed from the record alone. */
export interface TraceContext {
  record: Omit<TraceRecord, 'events'>;
  complaint: string;
  /** Circuits that misbehave, as stated at intake. */
  suspects: CircuitId[];
  feed: Feed | null;
  cautions: CautionId[];
  confirmed: Record<CircuitId, { outcome: Seen | 'dark'; amps?: number }>;
  wiggled: Record<CircuitId, Seen>;
  /** The circuit being narrowed. */
  circuit: CircuitId | null;
  hunt: number;
  powerUps: PowerUp[];
  /** Points open now. */
  open: PartId[];
  /** The set the person chose instead of the advice; `null` to follow the advice. */
  chosen: PartId[] | null;
  barred: { point: PartId; reason: BarReason }[];
  damage: { place: PlaceRef; note?: string }[];
  comesAndGoes: boolean;
  /** The most shorts believed to be there at once. */
  maxFaults: number;
  contradiction: ContradictionKind | null;
  /** Hard trips since the last cool-down. */
  overloads: number;
  inspected: {
    place: PlaceRef;
    method: 'look' | 'swap' | 'meter';
    finding: 'clear' | 'found';
    note?: string;
  }[];
  found: PlaceRef | null;
  repairs: Repair[];
  proven: Record<CircuitId, Seen>;
  lampCheck: Record<
    CircuitId,
    { outcome: Seen | null; amps?: number; lamps: Record<PartId, LampResult> }
  >;
  signature: {
    name: string;
    cause: string;
    correction: string;
    minutes: number;
    parts: PartUsed[];
    at: string;
    by: string;
  } | null;
}

/** Why the machine refuses an event. The words are the web's. */
export type RefusalReason =
  | 'notInThisStep'
  | 'tankTrailer'
  | 'unknownCircuit'
  | 'unknownPoint'
  | 'unknownPlace'
  | 'unknownLamp'
  | 'notSeparable'
  | 'barredPoint'
  | 'notOpen'
  | 'unchangedState'
  | 'coolDownNeeded'
  | 'contradictionOpen'
  | 'cautionsLeft'
  | 'circuitsLeft'
  | 'nothingChosen'
  | 'pointsStillOpen'
  | 'repairNotEnergised'
  | 'lampsLeft'
  | 'nothingToUndo'
  | 'notTheLastEvent'
  | 'fixed'
  | 'outOfSequence'
  | 'malformed';

/** A refusal with the facts that a sentence about it needs. */
export interface Refusal {
  reason: RefusalReason;
  /** Ids of the points, circuits, cautions or lamps it is about. */
  ids?: string[];
}
