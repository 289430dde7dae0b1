import { isAt, type TraceContext } from '@lampwright/trace';
import { useTraceContext, useTraceLog } from '../../store/trace-session';
import { ConfirmCircuit } from './confirm-circuit';
import { ConfirmSummary } from './confirm-summary';
import { NothingWrong } from './nothing-wrong';

/** Each suspect powered once with everything connected. */
export function ConfirmStep() {
  const next = useTraceContext(firstUnconfirmed);
  const nothingWrong = useTraceLog((log) => isAt(log, 'nothingWrong'));
  if (nothingWrong) return <NothingWrong />;
  return next === undefined ? <ConfirmSummary /> : <ConfirmCircuit key={next} circuit={next} />;
}

function firstUnconfirmed({ suspects, confirmed }: TraceContext) {
  return suspects.find((circuit) => !Object.hasOwn(confirmed, circuit));
}
