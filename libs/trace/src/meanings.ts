import type { PlaceRef } from '@lampwright/harness';
import { samePlace } from './places';
import type { Meaning } from './events';
import { knownSectionOf, situation } from './situation';
import type { TraceContext } from './state';

/** The most shorts at once that the belief can hold. */
const MOST_FAULTS = 3;

/**
 * What the open contradiction can mean, as things stand; empty without one. Contradicting readings are never explained
 * by the program: a person says what they mean.
 */
export function meaningsFor(context: TraceContext): Meaning[] {
  const { contradiction, comesAndGoes, maxFaults } = context;
  if (contradiction === null) return [];
  const allConnected = contradiction === 'holdsAllConnected';
  const fits: [Meaning, boolean][] = [
    ['repairedByHandling', contradiction !== 'nothingLeft'],
    ['comesAndGoes', allConnected || !comesAndGoes],
    // Another short cannot make everything hold.
    ['secondShort', !allConnected && maxFaults < MOST_FAULTS],
    ['planIsWrong', true],
  ];
  return fits.filter(([, fit]) => fit).map(([meaning]) => meaning);
}

/** Whether an inspection has spoken free every place of the section that the readings point to. */
export function isInspectedClear(context: TraceContext): boolean {
  return knownSectionOf(context) !== null && placesLeft(context).length === 0;
}

/** The places of the known section that nobody has inspected yet. */
export function placesLeft(context: TraceContext): PlaceRef[] {
  const index = knownSectionOf(context);
  const section = index === null ? undefined : situation(context)?.tree.sections[index];
  const places = section?.places.map(({ ref }) => ref) ?? [];
  return places.filter((ref) => !context.inspected.some(({ place }) => samePlace(place, ref)));
}
