import { contextOf, summaryOf, type TraceLog } from '@lampwright/trace';
import { TraceCircuit, type Trace } from './trace.entity';

/** Brings the summary columns of a trace to what its events add up to. `trace.circuits` must be loaded. */
export function applySummary(trace: Trace, log: TraceLog): void {
  const summary = summaryOf(log);
  trace.step = summary.step;
  trace.complaint = summary.complaint;
  trace.powerUps = summary.powerUps;
  trace.foundLabel = summary.found;
  trace.signedAt = summary.signedAt === null ? null : new Date(summary.signedAt);
  applyCircuits(trace, summary.circuits, contextOf(log).record.plan.harness.circuits);
}

/** Keeps the rows of circuits that stay, since a row cannot be removed and added again at once. */
function applyCircuits(
  trace: Trace,
  ids: readonly string[],
  known: readonly { id: string; name: string }[],
): void {
  const rows = new Map(trace.circuits.getItems().map((row) => [row.circuit, row]));
  for (const [circuit, row] of rows) if (!ids.includes(circuit)) trace.circuits.remove(row);
  ids.forEach((circuit, position) => {
    const row = rows.get(circuit);
    if (row) row.position = position;
    else trace.circuits.add(createCircuit(trace, circuit, position, known));
  });
}

function createCircuit(
  trace: Trace,
  circuit: string,
  position: number,
  known: readonly { id: string; name: string }[],
): TraceCircuit {
  const name = known.find(({ id }) => id === circuit)?.name ?? circuit;
  return Object.assign(new TraceCircuit(), { trace, circuit, position, name });
}
