import type { SectionTree } from '@lampwright/harness';
import { againstBest } from './againstBest';
import { bySection } from './bySection';
import { contactBetween, type ContactOhms } from './contact';
import { locate } from './locate';
import { contactFor, healthyOhms } from './meterReadings';
import type { Assumption, MeterView } from './meterView';
import type { OhmsRange } from './ohmmeter';

/** The assumptions about wires and lamps, and how much each counts. */
const ASSUMPTIONS: readonly (readonly [Assumption, number])[] = [
  ['least', 1 / 4],
  ['usual', 1 / 2],
  ['most', 1 / 4],
];

/**
 * By section index: how probable the reading is with one short there, against the best of them (`againstBest`). Where
 * the meter does not look, it is what the healthy harness gives. The contact's ohms that the reading leaves are worked
 * out in closed form. O(places).
 */
export function ohmsLikelihood(
  view: MeterView,
  tree: SectionTree,
  read: OhmsRange,
  { contact, misread }: { contact: ContactOhms; misread: number },
): number[] {
  const healthy = healthyFit(view, read);
  const fits = bySection(tree, (spot) => {
    const at = locate(view.wiring, view.usual.network, spot);
    if (!at) return healthy;
    return ASSUMPTIONS.reduce((sum, [which, weight]) => {
      const [low, high] = [read.least, read.most].map((ohms) => contactFor(view[which], at, ohms));
      return sum + weight * contactBetween(low ?? 0, high ?? 0, contact);
    }, 0);
  });
  return againstBest(fits, misread);
}

/** The part of what a healthy harness may read that lies within the reading. */
function healthyFit(view: MeterView, read: OhmsRange): number {
  const [least, most] = [healthyOhms(view.least), healthyOhms(view.most)];
  const [low, high] = [Math.max(least, read.least), Math.min(most, read.most)];
  if (low > high) return 0;
  return most > least ? (high - low) / (most - least) : 1;
}
