import { energisedSections, type PlaceRef, type SectionTree } from '@lampwright/harness';
import type { Belief, Reading } from '@lampwright/isolation';
import { samePlace } from './places';

/** A place that may hold the short. */
export interface RatedPlace {
  ref: PlaceRef;
  /** Index of its section in `Situation.tree`. */
  section: number;
  probability: number;
}

/**
 * A belief over the sections of `fine`, shared out among their places by weight; each place is told with its section in
 * `tree`. Most likely first. O(places × places of `tree`).
 */
export function placesInQuestion(
  fine: SectionTree,
  belief: Belief,
  tree: SectionTree,
): RatedPlace[] {
  const rated = belief.inQuestion.flatMap((index) => {
    const section = fine.sections[index];
    if (!section) return [];
    const { places, weight } = section;
    return places.map(({ ref, weight: own }) => ({
      ref,
      section: homeOf(tree, ref),
      probability:
        (belief.probabilities[index] ?? 0) * (weight > 0 ? own / weight : 1 / places.length),
    }));
  });
  return rated
    .filter(({ probability }) => probability > 0)
    .sort((a, b) => b.probability - a.probability);
}

function homeOf(tree: SectionTree, ref: PlaceRef): number {
  const home = tree.sections.find(({ places }) =>
    places.some((place) => samePlace(place.ref, ref)),
  );
  return home?.index ?? 0;
}

/** Without doubt about the readings: what cannot hold the short. With readings at odds: what once held. */
export function placesCleared(
  fine: SectionTree,
  belief: Belief,
  readings: readonly Reading[],
): PlaceRef[] {
  const held = belief.contradicted
    ? readings
        .filter(({ outcome }) => outcome === 'holds')
        .map(({ open }) => energisedSections(fine, open))
    : [];
  return fine.sections
    .filter(({ index }) =>
      belief.contradicted
        ? held.some((energised) => energised[index])
        : (belief.probabilities[index] ?? 0) === 0,
    )
    .flatMap(({ places }) => places.map(({ ref }) => ref));
}
