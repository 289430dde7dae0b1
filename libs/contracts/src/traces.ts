import type { CircuitId } from '@lampwright/harness';
import type { Refusal, Step, TraceEvent, TraceRecord } from '@lampwright/trace';
import type { PageQuery } from './paging';

/** Opens a trace on a trailer; the id is made by the client, so that a repeat is harmless. */
export interface OpenTraceRequest {
  id: string;
  trailerId: string;
}

export interface TraceSummaryDto {
  id: string;
  trailer: { id: string; unit: string; bodyType: string };
  author: { id: string; name: string };
  step: Step;
  complaint: string;
  circuits: CircuitId[];
  /** Names of the circuits, for lists. */
  circuitNames: string[];
  powerUps: number;
  openedAt: string;
  signedAt: string | null;
  /** Label of the place that held the short, once found. */
  found: string | null;
}

export interface TraceDto extends TraceSummaryDto {
  record: TraceRecord;
  /** True where the person who asks may add events. */
  writable: boolean;
}

export interface TraceListQuery extends PageQuery {
  step?: Step;
  /** `open` for those not signed and not abandoned. */
  state?: 'open' | 'signed' | 'abandoned';
  trailerId?: string;
  authorId?: string;
  circuit?: CircuitId;
}

/** Events in the order of their device's `seq`. */
export interface AppendEventsRequest {
  events: TraceEvent[];
}

export type AppendResult =
  | { id: string; outcome: 'accepted' | 'duplicate' }
  | { id: string; outcome: 'refused'; refusal: Refusal };

/** One answer an event. After a refusal the later events of the same batch are refused as `outOfSequence`. */
export interface AppendEventsResponse {
  results: AppendResult[];
  step: Step;
}
