import type { CircuitId, PartId, PlaceRef } from '@lampwright/harness';
import type { Feed } from './feed';

/** What every event carries besides its own data. */
export interface Envelope {
  /** Made where the event is recorded; a UUID v7. The same id is the same event for ever. */
  id: string;
  /** The tablet or browser that recorded it. */
  device: string;
  /** Counts up on each device within the trace, from 1. Order rests on it, never on `at`. */
  seq: number;
  /** ISO 8601, by the device's own clock: information only. */
  at: string;
  /** Id of the person. */
  by: string;
}

export type CautionId =
  | 'shopProcedure'
  | 'chocks'
  | 'powerOffFirst'
  | 'secondSource'
  | 'jewellery'
  | 'noBypass'
  | 'noHolding'
  | 'hotParts'
  | 'placard'
  | 'highVoltage'
  | 'abs';

export type BarReason = 'cantReach' | 'hardWired' | 'missing';
export type Seen = 'overload' | 'holds' | 'flickers';
export type LampResult = 'lit' | 'dark' | 'dim' | 'wrongCircuit';

/** What a reading against all that is known can mean. */
export type Meaning = 'repairedByHandling' | 'comesAndGoes' | 'planIsWrong' | 'secondShort';

export interface PartUsed {
  name: string;
  quantity: number;
}

/** What people say and do during a trace, by the step it belongs to. Names are `subject.verb`. */
export type TraceEventBody =
  // 1 Intake
  | { type: 'intake.stated'; complaint: string; circuits: CircuitId[]; feed: Feed }
  // 2 Make safe
  | { type: 'caution.ticked'; caution: CautionId }
  | { type: 'safety.confirmed' }
  // 3 Confirm: each circuit powered once with everything connected
  | { type: 'circuit.confirmed'; circuit: CircuitId; outcome: Seen | 'dark'; amps?: number }
  | { type: 'confirm.finished' }
  /** With nothing wrong any more: the harness is moved by hand under power that holds. */
  | { type: 'wiggle.read'; circuit: CircuitId; outcome: Seen }
  | { type: 'nothing.found' }
  // 4 Narrow
  | { type: 'circuit.chosen'; circuit: CircuitId }
  | { type: 'point.barred'; point: PartId; reason: BarReason }
  | { type: 'point.allowed'; point: PartId }
  | { type: 'damage.seen'; place: PlaceRef; note?: string }
  /** The person picks another set of points than the one advised; it stands until the next reading. */
  | { type: 'powerUp.chosen'; open: PartId[] }
  | {
      type: 'reading.taken';
      circuit: CircuitId;
      /** Every point that was open when power went on. */
      open: PartId[];
      outcome: Seen;
      amps?: number;
      /** What the planner proposed at that moment, for the replay. */
      advised?: PartId[];
    }
  | { type: 'contradiction.explained'; meaning: Meaning }
  | { type: 'feed.changed'; feed: Feed }
  | { type: 'coolDown.taken' }
  /** The person looks before the section is down to one. */
  | { type: 'inspection.started' }
  // 5 Inspect
  | {
      type: 'place.inspected';
      place: PlaceRef;
      method: 'look' | 'swap' | 'meter';
      finding: 'clear' | 'found';
      note?: string;
    }
  /** Nothing to be found here: back to narrowing. */
  | { type: 'narrowing.resumed' }
  // 6 Repair
  | {
      type: 'repair.made';
      place: PlaceRef;
      cause: string;
      correction: string;
      parts: PartUsed[];
      note?: string;
    }
  // 7 Prove
  | { type: 'proof.read'; circuit: CircuitId; outcome: Seen; amps?: number }
  // 8 Reconnect; also allowed while proving
  | { type: 'point.reconnected'; point: PartId }
  // 9 Lamp check
  | { type: 'circuit.powered'; circuit: CircuitId; outcome: Seen; amps?: number }
  | { type: 'lamp.checked'; circuit: CircuitId; lamp: PartId; result: LampResult; note?: string }
  /** Every lamp of the circuit that has no result yet is lit. */
  | { type: 'circuit.allLit'; circuit: CircuitId }
  | { type: 'lampCheck.finished' }
  // 10 Sign
  | {
      type: 'trace.signed';
      name: string;
      cause: string;
      correction: string;
      minutes: number;
      parts: PartUsed[];
    }
  // Any time
  /** Takes back the newest event that still stands. */
  | { type: 'event.undone'; target: string }
  /** Ends a trace begun by mistake; only while nothing has been opened. */
  | { type: 'trace.abandoned'; reason: string };

export type TraceEvent = Envelope & TraceEventBody;
export type TraceEventType = TraceEventBody['type'];
