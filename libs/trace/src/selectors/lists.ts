import type { CircuitId, Part, PartId } from '@lampwright/harness';
import { circuitsWithLamps } from '../circuits';
import type { LampResult, Seen } from '../events';
import { own } from '../own';
import type { PowerUp, TraceContext } from '../state';
import type { TraceLog } from '../traceLog';

/** The power-ups that stand, oldest first, for the history strip. */
export function standing(log: TraceLog): PowerUp[] {
  return log.snapshot.context.powerUps;
}

/** The parts to close again, front to rear. */
export function reconnectList(context: TraceContext): Part[] {
  return context.record.plan.harness.parts
    .filter(({ id }) => context.open.includes(id))
    .sort((a, b) => a.at.along - b.at.along);
}

/** One circuit of the lamp check. */
export interface LampsOfCircuit {
  circuit: CircuitId;
  /** What its power-up showed; `null` until it is powered. */
  outcome: Seen | null;
  lamps: { lamp: Part; result: LampResult | null }[];
}

/** Every circuit that lights lamps, with what was seen of each lamp so far, in the order of the plan. */
export function lampsToCheck(context: TraceContext): LampsOfCircuit[] {
  return circuitsWithLamps(context).map(({ circuit, lamps }) => {
    const check = own(context.lampCheck, circuit);
    return {
      circuit,
      outcome: check?.outcome ?? null,
      lamps: lamps.map((lamp) => ({ lamp, result: own(check?.lamps ?? {}, lamp.id) ?? null })),
    };
  });
}

/** Something that is not as it should be and stays on the record. */
export type Finding =
  | { kind: 'lamp'; circuit: CircuitId; lamp: PartId; result: Exclude<LampResult, 'lit'> }
  /** The circuit was dark when it was confirmed. */
  | { kind: 'darkCircuit'; circuit: CircuitId };

/** What the trace leaves for somebody to see to: lamps that do not light as they should, circuits that were dark. */
export function findings(context: TraceContext): Finding[] {
  const dark = Object.entries(context.confirmed)
    .filter(([, { outcome }]) => outcome === 'dark')
    .map(([circuit]): Finding => ({ kind: 'darkCircuit', circuit }));
  const lamps = lampsToCheck(context).flatMap(({ circuit, lamps: each }) =>
    each.flatMap(({ lamp, result }): Finding[] =>
      result && result !== 'lit' ? [{ kind: 'lamp', circuit, lamp: lamp.id, result }] : [],
    ),
  );
  return [...dark, ...lamps];
}
