import type { PlaceRef, SectionTree } from '@lampwright/harness';
import { locate } from './locate';
import { shortedOhms } from './meterReadings';
import type { MeterView } from './meterView';
import type { OhmsRange } from './ohmmeter';

/** A place whose short would read as the meter does, and how far along the conductor that is, in metres. */
export interface PlaceFit {
  place: PlaceRef;
  /** From the metered point. */
  metres: { least: number; most: number };
  /** False where only a stretch of the run fits. */
  whole: boolean;
}

/**
 * Every metered place where a short of 0 to `contactOhms` gives the reading, within the bounds of wires and lamps; a
 * run by the stretch of it that does. O(places).
 */
export function placesThatFit(
  view: MeterView,
  tree: SectionTree,
  read: OhmsRange,
  contactOhms: number,
): PlaceFit[] {
  const fits: PlaceFit[] = [];
  for (const { ref } of tree.sections.flatMap(({ places }) => places)) {
    const spotAt = (fraction: number) => {
      return locate(view.wiring, view.usual.network, { place: ref, fraction });
    };
    const [start, end] = [spotAt(0), spotAt(1)];
    if (!start || !end) continue;
    const forward = start.metres <= end.metres;
    const at = (share: number) => spotAt(forward ? share : 1 - share) ?? start;
    const notBeyond = (share: number) => shortedOhms(view.least, at(share), 0) <= read.most;
    const notBefore = (share: number) => {
      return shortedOhms(view.most, at(share), contactOhms) >= read.least;
    };
    if (!notBeyond(0) || !notBefore(1)) continue;
    const first = notBefore(0) ? 0 : turning((share) => !notBefore(share));
    const last = notBeyond(1) ? 1 : turning(notBeyond);
    if (first > last) continue;
    const metres = { least: at(first).metres, most: at(last).metres };
    fits.push({ place: ref, metres, whole: first === 0 && last === 1 });
  }
  return fits;
}

/** Where a statement that holds at 0 and fails at 1 turns, to a millionth. */
function turning(holds: (share: number) => boolean): number {
  let [yes, no] = [0, 1];
  while (no - yes > 1e-6) {
    const middle = (yes + no) / 2;
    if (holds(middle)) yes = middle;
    else no = middle;
  }
  return yes;
}
