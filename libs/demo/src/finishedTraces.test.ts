import { lampsOnCircuit, placeKey, placesOnCircuit } from '@lampwright/harness';
import { demoYard } from './demoYard';
import { finishedTraces } from './finishedTraces';
import { fleet } from './testing/fleet';

const stories = finishedTraces.map((story) => {
  const wired = fleet.find(({ trailer }) => trailer.id === story.trailerId);
  if (!wired) throw new Error(`${story.id} has no trailer`);
  return { ...wired, story };
});

describe('the finished traces', () => {
  it('tell of different trailers and circuits, once of two shorts and once of a dark lamp', () => {
    expect(stories.length).toBeGreaterThanOrEqual(6);
    expect(new Set(stories.map(({ unit }) => unit)).size).toBe(stories.length);
    expect(new Set(finishedTraces.flatMap(({ circuits }) => circuits)).size).toBe(6);
    expect(finishedTraces.filter(({ shorts }) => shorts.length === 2)).toHaveLength(1);
    expect(finishedTraces.filter(({ dark }) => dark !== undefined)).toHaveLength(1);
  });

  it.each(stories)('are worked on $unit by one who may, on no tank', ({ story, trailer }) => {
    const author = demoYard.people.find(({ id }) => id === story.authorId);
    expect(author?.role).toBe('technician');
    expect(trailer.bodyType).not.toBe('tank');
  });

  it.each(stories)(
    'hide their shorts on the circuit of $unit that misbehaves',
    ({ story, harness }) => {
      for (const { circuit, place } of story.shorts) {
        expect(story.circuits).toContain(circuit);
        const places = placesOnCircuit(harness, circuit).map(({ ref }) => placeKey(ref));
        expect(places).toContain(placeKey(place));
      }

      const lamps = harness.circuits.flatMap(({ id }) => lampsOnCircuit(harness, id));
      for (const { lamp } of story.dark ?? []) expect(lamps.map(({ id }) => id)).toContain(lamp);
    },
  );
});
