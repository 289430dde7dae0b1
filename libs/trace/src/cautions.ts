import type { CautionId } from './events';
import type { Feed } from './feed';
import type { TraceTrailer } from './record';
import type { TraceContext } from './state';

/** The cautions that fit this trailer and the stated feed, in the order in which they are read; none before intake. */
export function cautionsFor(context: TraceContext): CautionId[] {
  return context.feed ? cautionsOf(context.record.trailer, context.feed) : [];
}

/** The cautions that fit a trailer fed in a certain way. */
export function cautionsOf(trailer: TraceTrailer, feed: Feed): CautionId[] {
  const fits: [CautionId, boolean][] = [
    ['shopProcedure', true],
    ['placard', true],
    ['chocks', true],
    ['powerOffFirst', true],
    ['secondSource', trailer.secondSources.length > 0],
    ['jewellery', true],
    ['noBypass', true],
    // An ohm-meter is used with no power on, so there is no overload to hold.
    ['noHolding', feed.kind !== 'ohmmeter'],
    ['hotParts', true],
    ['highVoltage', trailer.bodyType === 'refrigerated' || hasRefrigeration(trailer)],
    ['abs', trailer.abs],
  ];
  return fits.filter(([, fit]) => fit).map(([caution]) => caution);
}

function hasRefrigeration(trailer: TraceTrailer): boolean {
  return trailer.secondSources.includes('refrigeration');
}

/** Those of `cautions` that nobody has ticked yet. */
export function cautionsLeft(context: TraceContext, cautions = cautionsFor(context)): CautionId[] {
  return cautions.filter((caution) => !context.cautions.includes(caution));
}
