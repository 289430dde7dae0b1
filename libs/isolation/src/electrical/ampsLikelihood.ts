import {
  energisedSections,
  type CircuitId,
  type Harness,
  type PartId,
  type SectionTree,
} from '@lampwright/harness';
import { againstBest, MISREAD } from './againstBest';
import { DEFAULT_AMMETER, trueAmps } from './ammeter';
import type { AmpsVerdictOptions } from './ampsVerdict';
import { bySection } from './bySection';
import { CONTACT_UNDER_POWER, contactBetween, type ContactOhms } from './contact';
import { expectedLoad } from './expectedLoad';
import { sourceOf, usualOhmsPerMetre } from './feeding';
import { hotSiemens } from './loads';
import { locate } from './locate';
import { networkFrom } from './network';
import { portAt } from './port';
import { solveTree } from './resistorTree';
import { wiringOf } from './wiring';

export interface AmpsLikelihoodOptions extends AmpsVerdictOptions {
  /** What the short's own ohms may be. Default `CONTACT_UNDER_POWER`. */
  contact?: ContactOhms;
  /** Probability that an energised short is there at the moment of reading. Default 1. */
  detection?: number;
  /** Probability that the reading says nothing. Default `MISREAD`. */
  misread?: number;
}

/**
 * By section index: how well an amps reading of a circuit that holds fits one short there, against the section that it
 * fits best (`againstBest`), to reweigh a belief with. It takes the place of the outcome "holds" where a short may be too weak to
 * trip. A short in an energised section adds its amps to what the lamps draw within their bands; elsewhere it adds none.
 * The contact's ohms that the reading leaves are worked out in closed form, so there is no grid. O(parts + places).
 *
 * @throws UnknownCircuitError
 * @throws RangeError as `solveCircuit` does.
 */
export function ampsLikelihood(
  tree: SectionTree,
  harness: Harness,
  circuit: CircuitId,
  open: readonly PartId[],
  amps: number,
  options: AmpsLikelihoodOptions = {},
): number[] {
  const { contact = CONTACT_UNDER_POWER, detection = 1, misread = MISREAD } = options;
  const expected = expectedLoad(harness, circuit, open, options);
  const read = trueAmps(amps, options.meter ?? DEFAULT_AMMETER);
  const excess = { least: read.least - expected.most, most: read.most - expected.least };
  const healthy = excess.least <= 0 && excess.most >= 0 ? 1 : 0;

  const wiring = wiringOf(harness, circuit, new Set(open));
  const model = {
    ohmsPerMetre: usualOhmsPerMetre(options.copperCelsius),
    siemens: hotSiemens(harness, circuit),
  };
  const network = networkFrom(wiring, 0, model);
  const solution = solveTree(network.tree, sourceOf(harness, options));
  const shorted = bySection(tree, (spot) => {
    const place = locate(wiring, network, spot);
    if (!place) return 0;
    const port = portAt(network.tree, solution, place.node, place.share);
    const drawing = port.volts ** 2 / solution.source.volts;
    const contactFor = (extra: number) => (extra > 0 ? drawing / extra - port.ohms : Infinity);
    return contactBetween(contactFor(excess.most), contactFor(excess.least), contact);
  });
  const fits = energisedSections(tree, open).map((energised, section) => {
    const shown = energised ? detection : 0;
    return shown * (shorted[section] ?? 0) + (1 - shown) * healthy;
  });
  return againstBest(fits, misread);
}
