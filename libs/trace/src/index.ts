export { appendEvent, canUndo, nextSeq } from './appendEvent';
export type { AppendOutcome } from './appendEvent';
export { cautionsFor, cautionsLeft } from './cautions';
export { circuitsToProve, circuitsWithLamps, suspectedCircuits } from './circuits';
export { effectiveEvents } from './effectiveEvents';
export type { EventOf } from './eventOf';
export { isTraceEventType, TRACE_EVENT_TYPES } from './eventTypes';
export type * from './events';
export type * from './feed';
export { coolDownDue, isOverload, tripsHard } from './feeds';
export { meaningsFor, placesLeft } from './meanings';
export { samePlace } from './places';
export { pointsToCloseFirst } from './pointsToCloseFirst';
export { isUnchanged } from './powerUps';
export { TRACE_FORMAT } from './record';
export type * from './record';
export {
  findings,
  lampsToCheck,
  reconnectList,
  standing,
  type Finding,
  type LampsOfCircuit,
} from './selectors/lists';
export { minutesByStep } from './selectors/minutesByStep';
export { contextOf, isAt, stepOf } from './selectors/stepOf';
export { summaryOf, type TraceSummary } from './selectors/summaryOf';
export { defaultSettings } from './settings';
export type { RatedPlace } from './ratedPlaces';
export { knownSectionOf, situation, type Situation } from './situation';
export type * from './state';
export { traceLogic, type TraceActorState } from './traceLogic';
export { foldTrace, openTrace, type SkippedEvent, type TraceLog } from './traceLog';
export { traceMachine, type TraceSnapshot, type TraceTag } from './traceMachine';
export { type TraceFault, type TraceFaultCode, type TraceReading } from './reading/faults';
export { readTraceEvent } from './reading/readTraceEvent';
export { readTraceRecord } from './reading/readTraceRecord';
export { playTrace } from './play/playTrace';
export type { HiddenShort, PlayOptions, TraceStory } from './play/story';
