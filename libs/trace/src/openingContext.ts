import type { TraceRecord } from './record';
import type { TraceContext } from './state';

/** What is known before anybody has said anything. */
export function openingContext(record: Omit<TraceRecord, 'events'>): TraceContext {
  return {
    record,
    complaint: '',
    suspects: [],
    feed: null,
    cautions: [],
    confirmed: {},
    wiggled: {},
    circuit: null,
    hunt: 1,
    powerUps: [],
    open: [],
    chosen: null,
    barred: [],
    damage: [],
    comesAndGoes: false,
    maxFaults: 1,
    contradiction: null,
    overloads: 0,
    inspected: [],
    found: null,
    repairs: [],
    proven: {},
    lampCheck: {},
    signature: null,
  };
}
