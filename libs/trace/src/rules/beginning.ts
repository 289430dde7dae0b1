import { cautionsLeft, cautionsOf } from '../cautions';
import type { Feed } from '../feed';
import { own } from '../own';
import { isUnchanged } from '../powerUps';
import { refuse, refuseIfAny, type Rule } from './rule';
import { ruleForCircuits } from './things';

/** Any feed that puts power on the trailer. */
const POWERED: Feed = { kind: 'fuse', atHand: false };

/** A tank trailer is never powered with this program's help; there is no way past. */
export const ruleForStatement: Rule<'intake.stated'> = (context, event) => {
  const { bodyType, id } = context.record.trailer;
  if (bodyType === 'tank') return refuse('tankTrailer', [id]);
  if (event.circuits.length === 0) return refuse('nothingChosen', ['circuits']);
  return ruleForCircuits(context, event.circuits);
};

/**
 * Only cautions that fit the trailer can be ticked: a tick under one that does not would mean nothing. Those about power
 * may be ticked ahead, before an ohm-meter gives way to it.
 */
export const ruleForTick: Rule<'caution.ticked'> = (context, event) =>
  cautionsOf(context.record.trailer, POWERED).includes(event.caution)
    ? null
    : refuse('malformed', [event.caution]);

export const ruleForSafety: Rule<'safety.confirmed'> = (context) =>
  refuseIfAny('cautionsLeft', cautionsLeft(context));

/** Each circuit is powered once with everything connected; one that overloaded is not powered again unchanged. */
export const ruleForConfirming: Rule<'circuit.confirmed'> = (context, event) =>
  ruleForCircuits(context, [event.circuit]) ??
  (isUnchanged(context, event.circuit, []) ? refuse('unchangedState', [event.circuit]) : null);

export const ruleForConfirmed: Rule<'confirm.finished'> = (context) =>
  refuseIfAny(
    'circuitsLeft',
    context.suspects.filter((circuit) => !own(context.confirmed, circuit)),
  );

export const ruleForWiggle: Rule<'wiggle.read'> = (context, event) =>
  ruleForCircuits(context, [event.circuit]);

/** Another feed may need cautions that the first one did not. */
export const ruleForFeed: Rule<'feed.changed'> = (context, event) =>
  refuseIfAny(
    'cautionsLeft',
    cautionsLeft(context, cautionsOf(context.record.trailer, event.feed)),
  );

/** A trace ends as a mistake only while nothing was opened and nothing was read in the narrowing. */
export const ruleForAbandoning: Rule<'trace.abandoned'> = (context) =>
  refuseIfAny('pointsStillOpen', context.open) ??
  (context.powerUps.length > 0
    ? refuse(
        'notInThisStep',
        context.powerUps.map(({ eventId }) => eventId),
      )
    : null);
