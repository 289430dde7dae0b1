import { isAllConnected } from '../powerUps';
import { situation } from '../situation';
import type { ContradictionKind, PowerUp, TraceContext } from '../state';
import { tripsAfter } from '../feeds';
import type { EventOf } from '../eventOf';
import type { Change } from './change';
import { onCircuit } from './onCircuit';

export const chooseCircuit: Change<'circuit.chosen'> = (context, { circuit }) =>
  onCircuit(context, circuit);

export const barPoint: Change<'point.barred'> = (context, { point, reason }) => ({
  ...context,
  barred: [...context.barred.filter((bar) => bar.point !== point), { point, reason }],
  chosen: context.chosen?.includes(point) ? null : context.chosen,
});

export const allowPoint: Change<'point.allowed'> = (context, { point }) => ({
  ...context,
  barred: context.barred.filter((bar) => bar.point !== point),
});

export const noteDamage: Change<'damage.seen'> = (context, { place, note }) => ({
  ...context,
  damage: [...context.damage, { place, ...(note !== undefined && { note }) }],
});

export const choosePowerUp: Change<'powerUp.chosen'> = (context, { open }) => ({
  ...context,
  chosen: open,
});

export const takeReading: Change<'reading.taken'> = (context, event) => {
  const powerUp: PowerUp = {
    ...powerUpOf(context, event, event.open),
    ...(event.advised && { advised: event.advised }),
  };
  const next = withPowerUp({ ...context, open: event.open, chosen: null }, powerUp);
  return { ...next, contradiction: contradictionAfter(next, powerUp) };
};

/** A power-up as the record keeps it. */
export function powerUpOf(
  context: TraceContext,
  event: EventOf<'reading.taken' | 'proof.read'> | EventOf<'circuit.powered'>,
  open: string[],
): PowerUp {
  return {
    eventId: event.id,
    at: event.at,
    circuit: event.circuit,
    open,
    seen: event.outcome,
    ...(event.amps !== undefined && { amps: event.amps }),
    hunt: context.hunt,
    counts: true,
  };
}

export function withPowerUp(context: TraceContext, powerUp: PowerUp): TraceContext {
  return {
    ...context,
    powerUps: [...context.powerUps, powerUp],
    comesAndGoes: context.comesAndGoes || powerUp.seen === 'flickers',
    overloads: tripsAfter(context, powerUp.seen),
  };
}

/** What is wrong with the readings once this one is among them. */
function contradictionAfter(context: TraceContext, powerUp: PowerUp): ContradictionKind | null {
  if (powerUp.seen === 'holds' && isAllConnected(context, powerUp)) return 'holdsAllConnected';
  return situation(context)?.belief.contradicted ? 'nothingLeft' : null;
}
