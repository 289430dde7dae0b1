import type { CircuitId } from '@lampwright/harness';
import type { Reading } from '@lampwright/isolation';
import { isOverload } from './feeds';
import type { PowerUp, TraceContext } from './state';

/**
 * The power-ups that still say something about a circuit. What held holds for good. What overloaded says nothing more
 * once a repair has ended its hunt: the short it showed may be the one that is gone.
 */
export function countingPowerUps(context: TraceContext, circuit: CircuitId): PowerUp[] {
  return context.powerUps.filter(
    (powerUp) =>
      powerUp.circuit === circuit &&
      powerUp.counts &&
      (powerUp.hunt === context.hunt || !isOverload(powerUp.seen)),
  );
}

/** A power-up in the engine's words. */
export function readingOf(powerUp: PowerUp): Reading {
  return { open: powerUp.open, outcome: isOverload(powerUp.seen) ? 'overload' : 'holds' };
}
