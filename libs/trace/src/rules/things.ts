import {
  lampsOnCircuit,
  type CircuitId,
  type PartId,
  type PlaceRef,
  placeKey,
} from '@lampwright/harness';
import { isCircuit } from '../circuits';
import { isPlace } from '../places';
import type { Refusal, TraceContext } from '../state';
import { refuse, refuseIfAny } from './rule';

/** Whether the plan has these circuits, each named once. */
export function ruleForCircuits(
  context: TraceContext,
  circuits: readonly CircuitId[],
): Refusal | null {
  return (
    refuseIfAny(
      'unknownCircuit',
      circuits.filter((circuit) => !isCircuit(context, circuit)),
    ) ?? refuseIfAny('malformed', repeated(circuits))
  );
}

/** Whether these are points that a person can open now, each named once. */
export function ruleForPoints(context: TraceContext, points: readonly PartId[]): Refusal | null {
  const barred = new Set(context.barred.map(({ point }) => point));
  return (
    ruleForBuiltPoints(context, points) ??
    refuseIfAny(
      'barredPoint',
      points.filter((point) => barred.has(point)),
    ) ??
    refuseIfAny('malformed', repeated(points))
  );
}

/** Whether the plan has these points as separable ones. */
export function ruleForBuiltPoints(
  context: TraceContext,
  points: readonly PartId[],
): Refusal | null {
  const { parts } = context.record.plan.harness;
  const partById = new Map(parts.map((part) => [part.id, part]));
  return (
    refuseIfAny(
      'unknownPoint',
      points.filter((point) => !partById.has(point)),
    ) ??
    refuseIfAny(
      'notSeparable',
      points.filter((point) => !partById.get(point)?.separable),
    )
  );
}

/** Whether the plan has such a place. */
export function ruleForPlace(context: TraceContext, place: PlaceRef): Refusal | null {
  return isPlace(context.record.plan.harness, place)
    ? null
    : refuse('unknownPlace', [placeKey(place)]);
}

/** Whether the circuit lights such a lamp. */
export function ruleForLamp(
  context: TraceContext,
  circuit: CircuitId,
  lamp: PartId,
): Refusal | null {
  const lamps = lampsOnCircuit(context.record.plan.harness, circuit);
  return lamps.some(({ id }) => id === lamp) ? null : refuse('unknownLamp', [lamp]);
}

function repeated(ids: readonly string[]): string[] {
  return [...new Set(ids.filter((id, index) => ids.indexOf(id) !== index))];
}
