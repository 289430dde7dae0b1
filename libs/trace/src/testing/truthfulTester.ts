import { placesOnCircuit, type PlaceRef } from '@lampwright/harness';
import type { TraceEvent } from '../events';
import { samePlace } from '../places';
import { playTrace } from '../play/playTrace';
import type { HiddenShort, PlayOptions, TraceStory } from '../play/story';
import type { TraceRecord } from '../record';

/**
 * The events of a whole trace on which these shorts are hidden, read truthfully. Each short is on the first circuit of
 * the plan that has its place; with none hidden, the first circuit is suspected for nothing.
 */
export function truthfulTester(
  record: TraceRecord,
  hidden: readonly PlaceRef[],
  options: PlayOptions & Partial<TraceStory> = {},
): TraceEvent[] {
  const { harness } = record.plan;
  const shorts = hidden.map((place): HiddenShort => {
    const circuit = harness.circuits.find(({ id }) =>
      placesOnCircuit(harness, id).some(({ ref }) => samePlace(ref, place)),
    );
    if (!circuit) throw new Error(`The plan has no place ${place.id}`);
    return {
      circuit: circuit.id,
      place,
      cause: 'Insulation chafed through.',
      correction: 'Repaired and tied up.',
      parts: [],
    };
  });
  const story: TraceStory = {
    complaint: 'Fuse blows when the lamps are switched on.',
    circuits:
      shorts.length > 0
        ? [...new Set(shorts.map(({ circuit }) => circuit))]
        : harness.circuits.slice(0, 1).map(({ id }) => id),
    feed: { kind: 'seriesLamp', atHand: true },
    shorts,
    name: 'Sam Okafor',
    ...options,
  };
  return playTrace(record, story, options);
}
