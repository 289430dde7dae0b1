import { sectionTree, type SectionTree } from '@lampwright/harness';
import { MISREAD } from './againstBest';
import { CONTACT_OF_OVERLOAD, type ContactOhms } from './contact';
import { notNegative } from './feeding';
import { healthyOhms } from './meterReadings';
import { meterView, type MeterPoint, type MeterView } from './meterView';
import {
  DEFAULT_OHMMETER,
  trueOhms,
  type Ohmmeter,
  type OhmsRange,
  type OhmsReading,
} from './ohmmeter';
import { ohmsLikelihood } from './ohmsLikelihood';
import { placesThatFit, type PlaceFit } from './placesThatFit';

export interface OhmsQuestion extends MeterPoint {
  ohms: OhmsReading;
  /** Default `DEFAULT_OHMMETER`. */
  meter?: Ohmmeter;
  /** Of the way back, from the short along the ground to the meter's other lead. Default 0. */
  returnOhms?: number;
  /** The most that the short's own contact is taken to have where distance is asked. Default 0: a dead short. */
  contactOhms?: number;
  /** The circuit's sections as the trace has them; by default as the plan draws them. */
  tree?: SectionTree;
  /** What the short's own ohms may be in the likelihood. Default `CONTACT_OF_OVERLOAD`. */
  contact?: ContactOhms;
  /** Probability that the reading says nothing. Default `MISREAD`. */
  misread?: number;
}

export interface OhmsEvidence {
  /** What a healthy harness would read here, lamps cold and wires included; Infinity where nothing conducts. */
  healthy: OhmsRange;
  /** True where the reading may come from cold lamps alone: they read like a short. */
  lampsMayExplain: boolean;
  /** The places where a dead short would read so, in the order of the sections. */
  fits: PlaceFit[];
  /** Metres of conductor from the point to the short, over all places that fit; `null` where none does. */
  distance: { least: number; most: number } | null;
  /** Metres of conductor from the point to the farthest that the meter sees. */
  reach: number;
  /** True where a short fits, but one step of the display is worth the whole reach: it tells no place from another. */
  tooCoarse: boolean;
  /** Metres of the thickest metered conductor that one step of the display stands for; `null` without a conductor. */
  metresPerStep: number | null;
  /** By section index: how well the reading fits one short there, against the best; to reweigh a belief with. */
  likelihood: number[];
}

/**
 * What an ohms reading at an opened point says. O(parts + runs + places).
 *
 * @throws UnknownCircuitError
 * @throws PartNotOnCircuitError
 * @throws RangeError for ohms that are negative or no number.
 */
export function ohmsEvidence(question: OhmsQuestion): OhmsEvidence {
  const { harness, circuit, ohms, meter = DEFAULT_OHMMETER } = question;
  const { contact = CONTACT_OF_OVERLOAD, misread = MISREAD } = question;
  const tree = question.tree ?? sectionTree(harness, circuit);
  const back = notNegative('returnOhms', question.returnOhms ?? 0);
  const view = meterView(question);
  if (ohms !== 'open') notNegative('ohms', ohms);
  const shown = trueOhms(ohms, meter);
  const read = { least: Math.max(0, shown.least - back), most: Math.max(0, shown.most - back) };

  const healthy = { least: healthyOhms(view.least), most: healthyOhms(view.most) };
  const contactOhms = notNegative('contactOhms', question.contactOhms ?? 0);
  const fits = placesThatFit(view, tree, read, contactOhms);
  const reach = view.usual.network.metres.reduce((most, metres) => Math.max(most, metres), 0);
  const step = metresPerStep(view, meter.resolution);
  return {
    healthy,
    lampsMayExplain: healthy.least <= read.most && read.least <= healthy.most,
    fits,
    distance: fits.length > 0 ? span(fits) : null,
    reach,
    tooCoarse: fits.length > 0 && step !== null && step >= reach,
    metresPerStep: step,
    likelihood: ohmsLikelihood(view, tree, read, { contact, misread }),
  };
}

function span(fits: readonly PlaceFit[]): { least: number; most: number } {
  return fits.reduce(
    (all, { metres }) => ({
      least: Math.min(all.least, metres.least),
      most: Math.max(all.most, metres.most),
    }),
    { least: Infinity, most: 0 },
  );
}

function metresPerStep({ usual }: MeterView, resolution: number): number | null {
  const { tree, branchesOf } = usual.network;
  let most = 0;
  for (const { piece, node } of [...branchesOf.values()].flat()) {
    const ohms = tree.ohms[node] ?? 0;
    if (ohms > 0) most = Math.max(most, (resolution * piece.metres) / ohms);
  }
  return most > 0 ? most : null;
}
