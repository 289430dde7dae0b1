import type { CircuitId, PartId } from '@lampwright/harness';
import { benchTree, energisesTheSame } from './bench';
import { countingPowerUps } from './countingReadings';
import { isOverload } from './feeds';
import { own } from './own';
import type { PowerUp, TraceContext } from './state';

/**
 * Whether a power-up would repeat a state that has nothing new to say. What overloaded last is never powered again
 * unchanged: that only heats the harness. What held is powered again only where the short comes and goes.
 */
export function isUnchanged(
  context: TraceContext,
  circuit: CircuitId,
  open: readonly PartId[],
): boolean {
  const tree = benchTree(context.record.plan.harness, circuit);
  const last = lastOverload(context, circuit);
  if (last && energisesTheSame(tree, last, open)) return true;
  if (context.comesAndGoes) return false;
  return countingPowerUps(context, circuit).some(
    (powerUp) => !isOverload(powerUp.seen) && energisesTheSame(tree, powerUp.open, open),
  );
}

/** The points that were open when the circuit was last powered, if it overloaded; confirming counts as the first time. */
function lastOverload(context: TraceContext, circuit: CircuitId): readonly PartId[] | null {
  const last = context.powerUps.findLast((powerUp) => powerUp.circuit === circuit);
  if (last) return isOverload(last.seen) ? last.open : null;
  const first = own(context.wiggled, circuit) ?? own(context.confirmed, circuit)?.outcome;
  return isOverload(first) ? [] : null;
}

/** Whether everything of the circuit was connected in a power-up. */
export function isAllConnected(context: TraceContext, powerUp: PowerUp): boolean {
  const tree = benchTree(context.record.plan.harness, powerUp.circuit);
  return energisesTheSame(tree, powerUp.open, []);
}
