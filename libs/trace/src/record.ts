import type { Harness } from '@lampwright/harness';
import type { TraceEvent } from './events';
import type { FeedKind } from './feed';

/** The number of the event format that this program writes. Format 1 had no `device` and no `seq`. */
export const TRACE_FORMAT = 2;

export type BodyType =
  | 'dryVan'
  | 'flatbed'
  | 'pup'
  | 'containerChassis'
  | 'refrigerated'
  | 'carHauler'
  | 'tank'
  | 'utility';

export type SecondSource = 'battery' | 'liftGate' | 'refrigeration' | 'solar';

/** The trailer as it stood when the trace was opened. */
export interface TraceTrailer {
  id: string;
  unit: string;
  bodyType: BodyType;
  secondSources: SecondSource[];
  abs: boolean;
}

/** The shop's settings as they stood when the trace was opened; a trace is always read with its own. */
export interface TraceSettings {
  powerSeconds: number;
  walkSecondsPerMetre: number;
  powerAlong: number;
  /** What an overload costs on each feed. */
  overloadSeconds: Record<FeedKind, number>;
  /** Hard trips before a cool-down is asked for. */
  overloadLimit: number;
  /** Probability that an energised short shows; lower once it is said to come and go. */
  detection: { steady: number; comesAndGoes: number };
}

/** A trace as stored and sent: its surroundings and its events. Everything else is computed from it. */
export interface TraceRecord {
  format: number;
  id: string;
  trailer: TraceTrailer;
  plan: { id: string; revision: number; harness: Harness };
  settings: TraceSettings;
  /** Id of the person who opened it. */
  author: string;
  /** ISO 8601. */
  openedAt: string;
  events: TraceEvent[];
}
