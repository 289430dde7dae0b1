import type { PlaceRef } from './sections';

/**
 * A text that is the same for the same place and differs for any other: `part:p3`, `part:p3:feed`, `run:w1`. For map
 * keys and storage; an id's own `:` and `%` are escaped.
 */
export function placeKey(ref: PlaceRef): string {
  const id = ref.id.replace(/[%:]/g, (sign) => (sign === '%' ? '%25' : '%3A'));
  if (ref.kind === 'run') return `run:${id}`;
  return ref.half ? `part:${id}:${ref.half}` : `part:${id}`;
}

/** The place of a `placeKey`; `null` for a text that `placeKey` cannot have made. */
export function parsePlaceKey(key: string): PlaceRef | null {
  const [, kind, escaped, half] =
    /^(part|run):((?:[^:%]|%25|%3A)*)(?::(feed|load))?$/s.exec(key) ?? [];
  if (escaped === undefined) return null;
  const id = escaped.replace(/%25|%3A/g, (sign) => (sign === '%25' ? '%' : ':'));
  if (kind === 'run') return half ? null : { kind, id };
  return half === 'feed' || half === 'load' ? { kind: 'part', id, half } : { kind: 'part', id };
}
