import { lampsToCheck } from '@lampwright/trace';
import { useMemo, useState } from 'react';
import { useTraceContext } from '../../store/trace-session';
import { CheckLamps } from './check-lamps';
import { LampCheckSummary } from './lamp-check-summary';
import { PowerCircuit } from './power-circuit';

/** Every circuit powered, every lamp that should light seen. */
export function LampCheckStep() {
  const context = useTraceContext((whole) => whole);
  const circuits = useMemo(() => lampsToCheck(context), [context]);
  const [reopened, setReopened] = useState<string | null>(null);
  const index = circuits.findIndex(
    ({ circuit, outcome, lamps }) =>
      circuit === reopened || outcome === null || lamps.some(({ result }) => result === null),
  );
  const current = circuits[index];
  if (!current) return <LampCheckSummary circuits={circuits} onReopen={setReopened} />;
  if (current.outcome === null) {
    return <PowerCircuit circuit={current.circuit} at={index + 1} of={circuits.length} />;
  }
  return (
    <CheckLamps
      key={current.circuit}
      check={current}
      at={index + 1}
      of={circuits.length}
      oneByOne={current.circuit === reopened}
      done={() => setReopened(null)}
    />
  );
}
