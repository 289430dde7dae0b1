import type { Part } from '@lampwright/harness';
import type { Extent } from './extent';

export type Zone = 'front' | 'deck' | 'rear';

/** How near to an end a part lies on that end's face, metres. */
const FACE_DEPTH = 0.45;
/** Fewer lamps than this read well from above. */
const CROWD = 4;
/** The height that a part without one is taken to have, metres. */
const USUAL_HEIGHT = 1;

export function heightOf(part: Part): number {
  return part.at.up ?? USUAL_HEIGHT;
}

/**
 * Sorts parts into the deck and the two end faces. From above, lamps of an end face lie on top of one another; a face
 * with a crowd at several heights is therefore folded out flat, its foot at the end of the deck.
 */
export function zonesOf(parts: readonly Part[], extent: Extent): Map<string, Zone> {
  const front = parts.filter((part) => part.at.along <= FACE_DEPTH && !isSideLamp(part));
  const rear = parts.filter(
    (part) => part.at.along >= extent.length - FACE_DEPTH && !isSideLamp(part),
  );
  const zones = new Map<string, Zone>(parts.map((part) => [part.id, 'deck']));
  if (isCrowd(front)) for (const part of front) zones.set(part.id, 'front');
  if (isCrowd(rear)) for (const part of rear) zones.set(part.id, 'rear');
  return zones;
}

function isCrowd(parts: readonly Part[]): boolean {
  return parts.filter((part) => part.kind === 'lamp').length >= CROWD;
}

function isSideLamp(part: Part): boolean {
  return part.lamp?.functions?.some((name) => name.startsWith('side')) ?? false;
}
