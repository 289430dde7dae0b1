import type { HarnessFault } from '../../faults';
import { goodPlan } from './goodPlan';

/** A document that the reader refuses, and every fault that it deserves, in the order they are found. */
export type MalformedPlan = { name: string; faults: HarnessFault[] } & (
  { document: unknown } | { text: string }
);

type Values = Record<string, unknown>;

/** The good plan with some top-level keys changed; a key given as `undefined` is taken out. */
export function plan(changes: Values): Values {
  return change({ ...goodPlan }, changes);
}

/** The good plan with some keys of one circuit changed. */
export function withCircuit(id: string, changes: Values): Values {
  return plan({ circuits: changeOne(goodPlan.circuits, id, changes) });
}

/** The good plan with some keys of one part changed. */
export function withPart(id: string, changes: Values): Values {
  return plan({ parts: changeOne(goodPlan.parts, id, changes) });
}

/** The good plan with some keys of one run changed. */
export function withRun(id: string, changes: Values): Values {
  return plan({ runs: changeOne(goodPlan.runs, id, changes) });
}

/** The good plan with further runs. */
export function withRuns(...runs: unknown[]): Values {
  return plan({ runs: [...goodPlan.runs, ...runs] });
}

/** The good plan with further parts. */
export function withParts(...parts: unknown[]): Values {
  return plan({ parts: [...goodPlan.parts, ...parts] });
}

/** The good plan without one of its runs. */
export function withoutRun(id: string): Values {
  return plan({ runs: goodPlan.runs.filter((run) => run.id !== id) });
}

function changeOne(items: readonly { id: string }[], id: string, changes: Values): Values[] {
  return items.map((item) => (item.id === id ? change({ ...item }, changes) : { ...item }));
}

function change(values: Values, changes: Values): Values {
  return Object.fromEntries(
    Object.entries({ ...values, ...changes }).filter(([, value]) => value !== undefined),
  );
}
