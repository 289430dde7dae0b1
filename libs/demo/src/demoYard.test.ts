import { expectedAmps, partsOnCircuit, readHarness, sectionTree } from '@lampwright/harness';
import type { Harness } from '@lampwright/harness';
import { demoYard } from './demoYard';
import { plans } from './plans';
import { fleet } from './testing/fleet';

/** How many lamps serve each function, per colour: `clearance amber` and so on. */
function functionsOf(harness: Harness): Map<string, number> {
  const counts = new Map<string, number>();
  for (const { lamp } of harness.parts) {
    for (const name of lamp?.functions ?? []) {
      const key = `${name} ${lamp?.colour}`;
      counts.set(key, (counts.get(key) ?? 0) + 1);
    }
  }
  return counts;
}

const count = (harness: Harness, name: string) =>
  [...functionsOf(harness)]
    .filter(([key]) => key.startsWith(`${name} `))
    .reduce((sum, [, each]) => sum + each, 0);

describe('the yard', () => {
  it('has one lead, three technicians and one trainee, with addresses that lead nowhere', () => {
    const roles = demoYard.people.map((person) => person.role).sort();
    expect(roles).toEqual(['lead', 'technician', 'technician', 'technician', 'trainee']);
    for (const { email } of demoYard.people) expect(email).toMatch(/^[a-z]+@[a-z-]+\.example$/);
  });

  it('has eight trailers of eight builds, each of a fleet of the yard', () => {
    expect(new Set(demoYard.trailers.map((trailer) => trailer.bodyType)).size).toBe(8);
    for (const trailer of demoYard.trailers) expect(demoYard.fleets).toContain(trailer.fleet);
  });

  it('gives everything an id of its own', () => {
    const ids = [...demoYard.people, ...demoYard.trailers, ...demoYard.plans].map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const id of ids) {
      expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-8[0-9a-f]{3}-[0-9a-f]{12}$/);
    }
  });
});

describe.each(fleet)('the plan of $unit', ({ trailer, harness }) => {
  it('reads without faults', () => {
    expect(readHarness(harness)).toEqual({ ok: true, harness });
  });

  it('has 20 to 120 parts, each with a label of its own and a sentence that finds it', () => {
    expect(harness.parts.length).toBeGreaterThanOrEqual(20);
    expect(harness.parts.length).toBeLessThanOrEqual(120);
    expect(new Set(harness.parts.map(({ label }) => label)).size).toBe(harness.parts.length);
    for (const { label, where } of harness.parts) {
      expect(label.length).toBeLessThanOrEqual(40);
      expect(where).toMatch(/^[A-Z].{14,}\.$/);
    }
  });

  it('lies inside the trailer, with no two parts on one spot', () => {
    harness.parts.forEach(({ id, at }, index) => {
      expect(at.along, id).toBeGreaterThanOrEqual(0);
      expect(at.along, id).toBeLessThanOrEqual(trailer.lengthMetres);
      expect(Math.abs(at.across), id).toBeLessThanOrEqual(trailer.widthMetres / 2);
      for (const other of harness.parts.slice(index + 1)) {
        const apart = Math.hypot(at.along - other.at.along, at.across - other.at.across);
        expect(apart, `${id} and ${other.id}`).toBeGreaterThanOrEqual(0.2);
      }
    });
  });

  it('has no run shorter than the way between its ends', () => {
    const at = new Map(harness.parts.map((part) => [part.id, part.at]));
    for (const run of harness.runs) {
      const [from, to] = [at.get(run.from)!, at.get(run.to)!];
      const straight = Math.hypot(
        to.along - from.along,
        to.across - from.across,
        (to.up ?? 0) - (from.up ?? 0),
      );
      expect(run.metres, run.id).toBeGreaterThanOrEqual(straight);
    }
  });

  it('falls into sections whose probabilities sum to 1, on every circuit', () => {
    for (const { id } of harness.circuits) {
      const { sections } = sectionTree(harness, id);
      expect(sections.length, id).toBeGreaterThan(1);
      expect(sections.reduce((sum, each) => sum + each.probability, 0)).toBeCloseTo(1, 9);
    }
  });

  // Quantities: 49 CFR 393.11, Table 1.
  it('has the lamps that the federal table asks of its width and length', () => {
    const wide = trailer.widthMetres >= 2.032;
    const long = trailer.lengthMetres > 9.144;
    const lamps = functionsOf(harness);
    const atLeast = (key: string, wanted: number) =>
      expect(lamps.get(key) ?? 0, key).toBeGreaterThanOrEqual(wanted);
    atLeast('tail red', 2);
    atLeast('stop red', 2);
    expect(count(harness, 'turn')).toBeGreaterThanOrEqual(2);
    atLeast('plate white', 1);
    atLeast('side-marker amber', long ? 4 : 2);
    atLeast('side-marker red', 2);
    if (wide) {
      atLeast('clearance amber', 2);
      atLeast('clearance red', 2);
      atLeast('identification red', 3);
    }
    expect(count(harness, 'abs')).toBe(trailer.abs ? 1 : 0);
    expect(harness.parts.some(({ id }) => id === 'abs-module')).toBe(trailer.abs);
  });

  it('keeps each side’s turn lamps on the circuit of that side', () => {
    const turns = harness.parts.filter(({ lamp }) =>
      lamp?.functions?.some((name) => name === 'turn' || name === 'mid-turn'),
    );
    for (const { at, lamp } of turns) {
      const circuits = lamp?.loads.map((load) => load.circuit);
      expect(circuits).toContain(at.across < 0 ? 'left' : 'right');
      expect(circuits).not.toContain(at.across < 0 ? 'right' : 'left');
    }
  });
});

describe('the running load', () => {
  const running = (harness: Harness) =>
    ['markers', 'tail']
      .map((circuit) =>
        expectedAmps(
          harness,
          circuit,
          partsOnCircuit(harness, circuit).map(({ id }) => id),
        ),
      )
      .reduce((sum, amps) => sum + amps, 0);

  // 20 functions: 2 tail, 2 stop, 2 turn, 1 plate, 6 side marker, 4 clearance, 3 identification (from 49 CFR 393.11).
  it('comes from 20 lamp functions on the van, and the ABS lamp', () => {
    const total = [...functionsOf(plans.dryVan.harness).values()].reduce((a, b) => a + b, 0);
    expect(total - count(plans.dryVan.harness, 'abs')).toBe(20);
    expect(count(plans.dryVan.harness, 'abs')).toBe(1);
  });

  // 16 LED lamps at the currents of common practice: 13 markers and a plate lamp at 0.05 A, two tails at 0.04 A.
  it('is under 1 A on the LED van', () => {
    expect(running(plans.dryVan.harness)).toBeCloseTo(13 * 0.05 + 0.05 + 2 * 0.04, 9);
    expect(running(plans.dryVan.harness)).toBeLessThan(1);
  });

  // Bulb currents from memory of SAE J573: 13 of no. 194, one 67, two 1157 (tail filament).
  it('is about 5 A on the filament flatbed', () => {
    expect(running(plans.flatbed.harness)).toBeCloseTo(13 * 0.27 + 0.59 + 2 * 0.59, 9);
  });

  it('splits black and brown differently from trailer to trailer', () => {
    const splits = demoYard.plans.map(({ harness }) =>
      harness.parts
        .filter(({ lamp }) => lamp?.loads.some(({ circuit }) => circuit === 'markers'))
        .map(({ id }) => id)
        .sort()
        .join(),
    );
    expect(new Set(splits).size).toBe(splits.length);
  });
});
