import type { TraceEvent, TraceEventType } from './events';

/** The event of one type, envelope included. */
export type EventOf<Type extends TraceEventType> = Extract<TraceEvent, { type: Type }>;
