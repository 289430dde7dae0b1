import type { TraceEventType } from './events';

const known: Record<TraceEventType, true> = {
  'intake.stated': true,
  'caution.ticked': true,
  'safety.confirmed': true,
  'circuit.confirmed': true,
  'confirm.finished': true,
  'wiggle.read': true,
  'nothing.found': true,
  'circuit.chosen': true,
  'point.barred': true,
  'point.allowed': true,
  'damage.seen': true,
  'powerUp.chosen': true,
  'reading.taken': true,
  'contradiction.explained': true,
  'feed.changed': true,
  'coolDown.taken': true,
  'inspection.started': true,
  'place.inspected': true,
  'narrowing.resumed': true,
  'repair.made': true,
  'proof.read': true,
  'point.reconnected': true,
  'circuit.powered': true,
  'lamp.checked': true,
  'circuit.allLit': true,
  'lampCheck.finished': true,
  'trace.signed': true,
  'event.undone': true,
  'trace.abandoned': true,
};

/** Every type of event that this program writes. */
export const TRACE_EVENT_TYPES = Object.keys(known) as TraceEventType[];

export function isTraceEventType(type: string): type is TraceEventType {
  return Object.hasOwn(known, type);
}
