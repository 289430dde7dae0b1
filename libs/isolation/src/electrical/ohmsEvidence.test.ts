import { PartNotOnCircuitError, placeKey, sectionTree, type Harness } from '@lampwright/harness';
import fc from 'fast-check';
import { conductorOhms } from './conductors';
import { locate } from './locate';
import { contactFor, healthyOhms, shortedOhms } from './meterReadings';
import { meterView, type MeterPoint } from './meterView';
import { ohmsEvidence } from './ohmsEvidence';
import { CIRCUIT, trailer } from './testing/trailer';
import type { Spot } from './wiring';

const bulbs = trailer();
const leds = trailer({ technology: 'led', amps: 0.05 });
const fine = { resolution: 0.001, tolerance: 0.002, leadOhms: 0 };
const coarse = { resolution: 0.1, tolerance: 0.01, leadOhms: 0.2 };

/** What a perfect meter reads with a short in the harness. */
function truth(point: MeterPoint, short: Spot & { ohms: number }): number {
  const { wiring, usual } = meterView(point);
  return shortedOhms(usual, locate(wiring, usual.network, short)!, short.ohms);
}

const beyondP1 = (harness: Harness): MeterPoint => ({
  harness,
  circuit: CIRCUIT,
  point: 'p1',
  side: 'load',
});

describe('a meter at an opened point', () => {
  it('reads cold filaments in parallel like a short, and LED lamps open', () => {
    // Four bulbs of 20 ohm lit are about 2 ohm each cold: half an ohm, and the wires.
    expect(healthyOhms(meterView(beyondP1(bulbs)).usual)).toBeCloseTo(0.56, 1);
    expect(healthyOhms(meterView(beyondP1(leds)).usual)).toBe(Infinity);
  });

  it('sees a 21 W bulb alone as a tenth of its 6.86 ohm', () => {
    const one = trailer({ amps: 21 / 12 });
    const alone = meterView({ harness: one, circuit: CIRCUIT, point: 'rear1', side: 'load' });
    expect(healthyOhms(alone.usual)).toBeCloseTo(0.686, 3);
  });

  it('looks back through the rest of the harness from the feed side', () => {
    const view = meterView({ harness: bulbs, circuit: CIRCUIT, point: 'p2', side: 'feed' });
    const { jointOf } = view.wiring;
    expect(view.usual.network.nodeAt.has(jointOf.get('p2')!.near)).toBe(true);
    expect(view.usual.network.nodeAt.has(jointOf.get('p2')!.far)).toBe(false);
    const short = { place: { kind: 'part', id: 'inlet' }, ohms: 0 } as const;
    const at = locate(view.wiring, view.usual.network, short)!;
    expect(at.metres).toBeCloseTo(9, 12);
  });

  it('reckons along a run from the end that the meter is at', () => {
    // From p2 back towards the inlet: 3 m to s1, then 4 m to p1; a quarter from p1 is 3 m from s1.
    const view = meterView({ harness: leds, circuit: CIRCUIT, point: 'p2', side: 'feed' });
    const spot = { place: { kind: 'run', id: 'to-s1' }, fraction: 0.25 } as const;
    const at = locate(view.wiring, view.usual.network, spot)!;
    expect(at.metres).toBeCloseTo(6, 12);
    expect(shortedOhms(view.usual, at, 0)).toBeCloseTo(6 * conductorOhms({ awg: 14 }).usual, 12);
  });

  it('is bounded: more ohms anywhere never read less (Rayleigh)', () => {
    const spots = sectionTree(bulbs, CIRCUIT).sections.flatMap(({ places }) => places);
    fc.assert(
      fc.property(
        fc.constantFrom(...spots),
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: 0, max: 5, noNaN: true }),
        ({ ref }, fraction, ohms) => {
          const view = meterView(beyondP1(bulbs));
          const at = locate(view.wiring, view.usual.network, { place: ref, fraction });
          if (!at) return true;
          const [least, usual, most] = [view.least, view.usual, view.most].map((assumed) =>
            shortedOhms(assumed, at, ohms),
          );
          const slack = 1 + 1e-12;
          return least! <= usual! * slack && usual! <= most! * slack;
        },
      ),
    );
  });

  it('works out the contact from the reading', () => {
    const { wiring, usual } = meterView(beyondP1(bulbs));
    const at = locate(wiring, usual.network, { place: { kind: 'run', id: 'to-s2' } })!;
    expect(contactFor(usual, at, shortedOhms(usual, at, 0.07))).toBeCloseTo(0.07, 9);
    expect(contactFor(usual, at, 0.001)).toBeLessThan(0);
    expect(contactFor(usual, at, 1000)).toBe(Infinity);
  });
});

describe('ohmsEvidence', () => {
  it('worth of a step: 0.1 ohm is 12 m of 14 AWG', () => {
    const { metresPerStep } = ohmsEvidence({ ...beyondP1(leds), ohms: 0.3, meter: coarse });
    expect(metresPerStep).toBeCloseTo(0.1 / conductorOhms({ awg: 14 }).usual, 9);
    expect(metresPerStep).toBeCloseTo(12.07, 2);
  });

  it('owns that an ordinary meter cannot tell the places apart', () => {
    const short = { place: { kind: 'run', id: 'to-p2' }, ohms: 0 } as const;
    const exact = truth(beyondP1(leds), short) + coarse.leadOhms;
    const said = ohmsEvidence({
      ...beyondP1(leds),
      ohms: Number(exact.toFixed(1)),
      meter: coarse,
    });
    expect(said.tooCoarse).toBe(true);
    expect(said.lampsMayExplain).toBe(false);
    expect(said.reach).toBeCloseTo(9, 9);
    expect(said.distance!.least).toBe(0);
    expect(said.distance!.most).toBeGreaterThan(5.5);
  });

  it('measures the way with a milliohm meter', () => {
    const short = { place: { kind: 'run', id: 'to-p2' }, fraction: 0.5, ohms: 0 } as const;
    const ohms = truth(beyondP1(leds), short);
    const said = ohmsEvidence({ ...beyondP1(leds), ohms, meter: fine });
    expect(said.tooCoarse).toBe(false);
    // 5.5 m of solid copper; stranded wire, 21 % dearer, would be as near as 4.5 m.
    expect(said.distance!.most).toBeGreaterThan(5.5);
    expect(said.distance!.most).toBeLessThan(5.7);
    expect(said.distance!.least).toBeGreaterThan(4.4);
    const placed = said.fits.map(({ place }) => place.id).sort();
    expect(placed).toEqual(['front1', 'front2', 'to-front1', 'to-front2', 'to-p2']);
    const stretch = said.fits.find(({ place }) => place.id === 'to-p2')!;
    expect(stretch.whole).toBe(false);
    expect(stretch.metres.least).toBeLessThan(5.5);
    expect(stretch.metres.most).toBeGreaterThan(5.5);
  });

  it('keeps the true place among those that fit, whatever the wires really are', () => {
    const spots = sectionTree(bulbs, CIRCUIT).sections.flatMap(({ places }) => places);
    fc.assert(
      fc.property(
        fc.constantFrom('least', 'usual', 'most'),
        fc.constantFrom(bulbs, leds),
        fc.constantFrom(...spots),
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.constantFrom('load', 'feed'),
        (wires, harness, { ref }, fraction, side) => {
          const point = { ...beyondP1(harness), point: 'p2', side } as const;
          const view = meterView(point);
          const at = locate(view.wiring, view[wires].network, { place: ref, fraction });
          if (!at) return true;
          const ohms = shortedOhms(view[wires], at, 0);
          const { fits, distance } = ohmsEvidence({ ...point, ohms, meter: fine });
          const fit = fits.find(({ place }) => placeKey(place) === placeKey(ref));
          return (
            fit !== undefined &&
            fit.metres.least <= at.metres + 1e-5 &&
            at.metres <= fit.metres.most + 1e-5 &&
            distance!.least <= fit.metres.least &&
            fit.metres.most <= distance!.most
          );
        },
      ),
      { numRuns: 200 },
    );
  });

  it('warns that cold lamps may be all there is', () => {
    const said = ohmsEvidence({ ...beyondP1(bulbs), ohms: 0.8, meter: coarse });
    expect(said.lampsMayExplain).toBe(true);
    const { sections } = sectionTree(bulbs, CIRCUIT);
    const near = sections[0]!.index;
    // It cannot be a dead short beyond p1, but it may be a poor one there, or any on the other side.
    expect(said.likelihood[near]).toBeGreaterThan(0.1);
    expect(said.fits).toEqual([]);
  });

  it('clears what LED lamps leave open', () => {
    const said = ohmsEvidence({ ...beyondP1(leds), ohms: 'open', meter: coarse });
    expect(said).toMatchObject({
      fits: [],
      distance: null,
      tooCoarse: false,
      lampsMayExplain: true,
    });
    const [near, ...beyond] = said.likelihood;
    expect(near).toBeCloseTo(1, 12);
    expect(beyond.every((value) => Math.abs(value - 0.01) < 1e-12)).toBe(true);
  });

  it('puts a dead short on the side where the meter looks', () => {
    const short = { place: { kind: 'part', id: 's2' }, ohms: 0.005 } as const;
    const ohms = truth(beyondP1(leds), short);
    const { likelihood } = ohmsEvidence({ ...beyondP1(leds), ohms, meter: fine });
    const tree = sectionTree(leds, CIRCUIT);
    const best = likelihood.indexOf(Math.max(...likelihood));
    expect(tree.sections[best]!.places.some(({ ref }) => ref.id === 's2')).toBe(true);
    expect(likelihood[0]).toBeCloseTo(0.01, 12);
  });

  it('takes leads, the way back and warm copper off', () => {
    const cold = { place: { kind: 'part', id: 's2' }, ohms: 0 } as const;
    const plain = ohmsEvidence({
      ...beyondP1(leds),
      ohms: truth(beyondP1(leds), cold),
      meter: fine,
    });
    const warm = { ...beyondP1(leds), copperCelsius: 60 };
    const said = ohmsEvidence({
      ...warm,
      ohms: truth(warm, cold) + 0.15 + 0.02,
      returnOhms: 0.02,
      meter: { resolution: 0.001, tolerance: 0, leadOhms: 0.15 },
    });
    expect(said.distance!.most).toBeCloseTo(plain.distance!.most, 1);
  });

  it('refuses what is no reading', () => {
    expect(() => ohmsEvidence({ ...beyondP1(leds), ohms: -1 })).toThrow(RangeError);
    expect(() => ohmsEvidence({ ...beyondP1(leds), ohms: NaN })).toThrow(RangeError);
    expect(() => ohmsEvidence({ ...beyondP1(leds), point: 'nowhere', ohms: 1 })).toThrow(
      PartNotOnCircuitError,
    );
  });
});
