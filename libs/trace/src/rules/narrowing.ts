import { placeKey, type CircuitId, type PartId } from '@lampwright/harness';
import { suspectedCircuits } from '../circuits';
import { meaningsFor, placesLeft } from '../meanings';
import { sectionsOf } from '../places';
import { isUnchanged } from '../powerUps';
import { benchTree } from '../bench';
import { knownSectionOf } from '../situation';
import type { Refusal, TraceContext } from '../state';
import { refuse, refuseIfAny, type Rule } from './rule';
import { ruleForBuiltPoints, ruleForCircuits, ruleForPlace, ruleForPoints } from './things';

export const ruleForReading: Rule<'reading.taken'> = (context, event) =>
  ruleForCircuits(context, [event.circuit]) ??
  (event.circuit === context.circuit ? null : refuse('unknownCircuit', [event.circuit])) ??
  ruleForPowerUp(context, event.circuit, event.open);

export const ruleForChoice: Rule<'powerUp.chosen'> = (context, event) =>
  context.circuit === null
    ? refuse('nothingChosen', ['circuit'])
    : ruleForPowerUp(context, context.circuit, event.open);

function ruleForPowerUp(
  context: TraceContext,
  circuit: CircuitId,
  open: readonly PartId[],
): Refusal | null {
  return (
    ruleForPoints(context, open) ??
    (isUnchanged(context, circuit, open) ? refuse('unchangedState', [circuit]) : null)
  );
}

/** Only a circuit that showed the fault is narrowed; on any other a fault would be made up. */
export const ruleForCircuit: Rule<'circuit.chosen'> = (context, event) =>
  suspectedCircuits(context).includes(event.circuit)
    ? null
    : refuse('unknownCircuit', [event.circuit]);

/** A point that is open now can be opened, whatever is said of it. */
export const ruleForBarring: Rule<'point.barred'> = (context, event) =>
  ruleForBuiltPoints(context, [event.point]) ??
  refuseIfAny(
    'pointsStillOpen',
    context.open.filter((point) => point === event.point),
  );

export const ruleForAllowing: Rule<'point.allowed'> = (context, event) =>
  ruleForBuiltPoints(context, [event.point]);

export const ruleForDamage: Rule<'damage.seen'> = (context, event) =>
  ruleForPlace(context, event.place);

export const ruleForExplanation: Rule<'contradiction.explained'> = (context, event) => {
  const meanings = meaningsFor(context);
  return meanings.includes(event.meaning) ? null : refuse('contradictionOpen', meanings);
};

export const ruleForInspecting: Rule<'place.inspected'> = (context, event) => {
  const unknown = ruleForPlace(context, event.place);
  if (unknown || context.circuit === null) return unknown;
  const tree = benchTree(context.record.plan.harness, context.circuit);
  return sectionsOf(tree, event.place).length > 0
    ? null
    : refuse('unknownPlace', [placeKey(event.place)]);
};

/** While the readings point to one section, every place of it is looked at before anything else is believed. */
export const ruleForResuming: Rule<'narrowing.resumed'> = (context) =>
  knownSectionOf(context) === null
    ? null
    : refuseIfAny('notInThisStep', placesLeft(context).map(placeKey));
