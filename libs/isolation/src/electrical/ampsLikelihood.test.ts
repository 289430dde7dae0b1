import { energisedSections, sectionTree } from '@lampwright/harness';
import { arbitraryHarness } from '@lampwright/harness/testing';
import fc from 'fast-check';
import { trueAmps } from './ammeter';
import { ampsLikelihood } from './ampsLikelihood';
import { expectedLoad } from './expectedLoad';
import { solveCircuit } from './solveCircuit';
import { CIRCUIT, trailer } from './testing/trailer';

const leds = trailer({ technology: 'led', amps: 0.05 });
const tree = sectionTree(leds, CIRCUIT);
const [energised, others] = [true, false].map((on) =>
  energisedSections(tree, ['p2']).flatMap((lit, index) => (lit === on ? [index] : [])),
);

const at = (sections: number[] | undefined, values: readonly number[]) =>
  (sections ?? []).map((index) => values[index]!);

const contact = { hard: 0.01, most: 1000 };
/** Even over log(1 + ohms / hard), as contacts are believed to be. */
const contactGrid = Array.from({ length: 2000 }, (_, step) => {
  return contact.hard * Math.expm1(((step + 0.5) / 2000) * Math.log1p(contact.most / contact.hard));
});

describe('ampsLikelihood', () => {
  it('puts a short that draws too much but does not trip into what is energised', () => {
    const likelihood = ampsLikelihood(tree, leds, CIRCUIT, ['p2'], 2.5);
    expect(Math.max(...at(others, likelihood))).toBeCloseTo(0.01, 12);
    expect(Math.min(...at(energised, likelihood))).toBeGreaterThan(0.9);
  });

  it('speaks for the rest where the lamps alone explain the reading', () => {
    const likelihood = ampsLikelihood(tree, leds, CIRCUIT, ['p2'], 0.1);
    expect(Math.min(...at(others, likelihood))).toBeCloseTo(1, 12);
    expect(Math.max(...at(energised, likelihood))).toBeLessThan(0.6);
  });

  it('says little where the short comes and goes', () => {
    const steady = ampsLikelihood(tree, leds, CIRCUIT, ['p2'], 0.1);
    const fickle = ampsLikelihood(tree, leds, CIRCUIT, ['p2'], 0.1, { detection: 0.3 });
    at(energised, fickle).forEach((value, i) => {
      expect(value).toBeGreaterThan(at(energised, steady)[i]!);
    });
  });

  it('tells a short far along a thin wire from one at the inlet by the most that it can draw', () => {
    // A dead short at the end of 11 m of 14 AWG draws 132 A; 150 A can only come from nearer.
    const likelihood = ampsLikelihood(tree, leds, CIRCUIT, [], 150, {
      meter: { resolution: 0.1, tolerance: 0 },
    });
    const rear = tree.sections.find(({ point }) => point?.partId === 'rear1')!.index;
    expect(likelihood[rear]).toBeCloseTo(0.01, 12);
    expect(likelihood[0]).toBeGreaterThan(0.01);
  });

  describe('has the share of contacts that give the reading, as a fine grid of solved circuits does', () => {
    const meter = { resolution: 0.1, tolerance: 0.03 };
    const raw = (open: string[], reading: number) =>
      ampsLikelihood(tree, leds, CIRCUIT, open, reading, { contact, meter, misread: 0 });
    const sectionOf = (id: string) =>
      tree.sections.find(({ point }) => point?.partId === id)!.index;
    const gridShare = (open: string[], id: string, reading: number) => {
      const { amps, least, most } = expectedLoad(leds, CIRCUIT, open);
      const read = trueAmps(reading, meter);
      const inside = contactGrid.filter((ohms) => {
        const shorts = [{ place: { kind: 'part', id } as const, ohms }];
        const extra = solveCircuit(leds, CIRCUIT, { open, shorts }).amps - amps;
        return least + extra <= read.most && read.least <= most + extra;
      });
      return inside.length / contactGrid.length;
    };

    it.each([0.05, 0.1, 0.2])('%d A, which lamps alone may draw', (reading) => {
      // Sections without power fit wholly, so the others show their share itself.
      const likelihood = raw(['p2'], reading);
      expect(likelihood[sectionOf('front1')]).toBeCloseTo(gridShare(['p2'], 'front1', reading), 2);
    });

    it.each([1.5, 60, 122])('%d A, which needs a short', (reading) => {
      const likelihood = raw([], reading);
      const ratio = likelihood[sectionOf('rear1')]! / likelihood[sectionOf('front1')]!;
      const grid = gridShare([], 'rear1', reading) / gridShare([], 'front1', reading);
      expect(Math.abs(ratio / grid - 1)).toBeLessThan(0.05);
    });
  });

  it('always allows for the section whose short really gave the reading', () => {
    const cases = arbitraryHarness().chain((harness) => {
      const circuit = harness.circuits[0]!.id;
      const { sections } = sectionTree(harness, circuit);
      // A place without any weight to speak of may be as unlikely as a misreading.
      const places = sections.flatMap(({ index, weight: all, places: here }) =>
        here
          .filter(({ ref, weight }) => ref.kind === 'part' && weight > all / 1000)
          .map(({ ref }) => ({ index, ref })),
      );
      return fc.record({
        harness: fc.constant(harness),
        circuit: fc.constant(circuit),
        place: places.length > 0 ? fc.constantFrom(...places) : fc.constant(null),
        ohms: fc.double({ min: 0.02, max: 500, noNaN: true }),
      });
    });
    fc.assert(
      fc.property(cases, ({ harness, circuit, place, ohms }) => {
        if (!place) return true;
        const feeding = { sourceOhms: 0.05 };
        const shorts = [{ place: place.ref, ohms }];
        const { amps } = solveCircuit(harness, circuit, { ...feeding, shorts });
        const all = sectionTree(harness, circuit);
        return ampsLikelihood(all, harness, circuit, [], amps, feeding)[place.index]! > 0.01;
      }),
    );
  });
});
