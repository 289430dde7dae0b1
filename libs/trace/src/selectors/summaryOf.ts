import type { CircuitId, PlaceRef } from '@lampwright/harness';
import type { Step, TraceContext } from '../state';
import type { TraceLog } from '../traceLog';
import { stepOf } from './stepOf';

/** What a list shows of a trace. */
export interface TraceSummary {
  step: Step;
  complaint: string;
  /** The circuits stated at intake. */
  circuits: CircuitId[];
  /** Power-ups of the narrowing and the proofs. */
  powerUps: number;
  /** Label of the part that held the short, or of the two parts that its run joins; `null` until one is found. */
  found: string | null;
  /** ISO 8601. */
  signedAt: string | null;
}

export function summaryOf(log: TraceLog): TraceSummary {
  const { context } = log.snapshot;
  const place = context.found ?? context.repairs.at(-1)?.place ?? null;
  return {
    step: stepOf(log),
    complaint: context.complaint,
    circuits: context.suspects,
    powerUps: context.powerUps.length,
    found: place && labelOf(context, place),
    signedAt: context.signature?.at ?? null,
  };
}

/** A place by the labels that the plan gives it; a run is told by its two ends. */
function labelOf(context: TraceContext, place: PlaceRef): string {
  const { parts, runs } = context.record.plan.harness;
  const label = (id: string) => parts.find((part) => part.id === id)?.label ?? id;
  if (place.kind === 'part') return label(place.id);
  const run = runs.find(({ id }) => id === place.id);
  return run ? `${label(run.from)} – ${label(run.to)}` : place.id;
}
