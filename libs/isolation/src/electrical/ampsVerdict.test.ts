import { energisedParts, expectedAmps, sectionTree } from '@lampwright/harness';
import { arbitraryHarness } from '@lampwright/harness/testing';
import fc from 'fast-check';
import { ampsVerdict } from './ampsVerdict';
import { expectedLoad } from './expectedLoad';
import { LAMP_BANDS } from './lampBand';
import { solveCircuit } from './solveCircuit';
import { CIRCUIT, trailer } from './testing/trailer';

const bulbs = trailer();
const leds = trailer({ technology: 'led', amps: 0.05 });
/** Amps read from the labels, and a supply that is known: a tenth either way, a twentieth. */
const known = {
  led: { ...LAMP_BANDS.led, least: 0.9, most: 1.1 },
  filament: { ...LAMP_BANDS.filament, least: 0.95, most: 1.05 },
};

describe('expectedLoad', () => {
  it('is the plan’s amps less what the wires take', () => {
    const all = expectedLoad(bulbs, CIRCUIT);
    const nominal = expectedAmps(bulbs, CIRCUIT, energisedParts(sectionTree(bulbs, CIRCUIT), []));
    expect(nominal).toBeCloseTo(2.4, 12);
    expect(all.amps).toBeLessThan(nominal);
    expect(all.amps).toBeGreaterThan(0.97 * nominal);
    expect(all.least).toBeCloseTo(0.85 * all.amps, 12);
    expect(all.most).toBeCloseTo(1.15 * all.amps, 12);
  });

  it('counts what is still connected', () => {
    expect([...expectedLoad(bulbs, CIRCUIT, ['p2', 'front1']).loads.keys()]).toEqual(['front2']);
    expect(expectedLoad(bulbs, CIRCUIT, ['p1'])).toMatchObject({ amps: 0, least: 0, most: 0 });
  });

  it('never exceeds the plan’s amps at nominal volts, on any plan', () => {
    fc.assert(
      fc.property(arbitraryHarness(), (harness) => {
        const circuit = harness.circuits[0]!.id;
        const lit = energisedParts(sectionTree(harness, circuit), []);
        const { amps, least, most } = expectedLoad(harness, circuit);
        const nominal = expectedAmps(harness, circuit, lit);
        const slack = 1e-9 * nominal + 1e-12;
        return amps <= nominal + slack && least <= amps + slack && amps <= most + slack;
      }),
    );
  });

  it('takes the bands of LED lamps from the reference table', () => {
    // Plate and marker lamps: 0.03 to 0.10 A about 0.05.
    expect(LAMP_BANDS.led).toMatchObject({ least: 0.5, most: 2, standing: 'memory' });
  });
});

describe('ampsVerdict', () => {
  const verdict = (harness: typeof bulbs, reading: number, open: string[] = []) =>
    ampsVerdict(harness, CIRCUIT, open, reading);

  it('calls a steady current of several amperes on an LED trailer a short that does not trip', () => {
    const solved = solveCircuit(leds, CIRCUIT, {
      shorts: [{ place: { kind: 'run', id: 'to-p2' }, ohms: 3 }],
    });
    const said = verdict(leds, Number(solved.amps.toFixed(1)));
    expect(said.kind).toBe('above');
    if (said.kind !== 'above') return;
    expect(said.excess.least).toBeLessThan(solved.shortAmps[0]!);
    expect(said.excess.most).toBeGreaterThan(solved.shortAmps[0]!);
  });

  it('says that a dead LED lamp would not show', () => {
    expect(verdict(leds, 0.2).kind).toBe('tooCoarse');
  });

  it('finds the group that is dark', () => {
    const said = verdict(bulbs, 1.2);
    expect(said.kind).toBe('below');
    if (said.kind !== 'below') return;
    expect(said.fits[0]).toMatchObject({ at: 'p2', loads: 2 });
  });

  it('finds one of four filament lamps dark where supply and lamps are known', () => {
    const said = ampsVerdict(bulbs, CIRCUIT, [], 1.8, {
      bands: known,
      meter: { resolution: 0.01, tolerance: 0.02 },
    });
    expect(said.kind).toBe('below');
    if (said.kind !== 'below') return;
    expect(said.fits.map(({ at }) => at).sort()).toEqual(['front1', 'front2', 'rear1', 'rear2']);
  });

  it('names the inlet when nothing is lit at all', () => {
    const said = verdict(bulbs, 0);
    expect(said).toMatchObject({ kind: 'below', fits: [{ at: 'inlet', loads: 4 }] });
  });

  it('is content with what the lamps draw, and lists what could hide', () => {
    const said = ampsVerdict(bulbs, CIRCUIT, ['p2'], 1.2, { bands: known });
    expect(said).toMatchObject({ kind: 'asExpected', mayHide: [] });
    expect(verdict(bulbs, 0, ['p1'])).toMatchObject({ kind: 'asExpected', mayHide: [] });
  });

  it('never says above or below of a healthy circuit that is read within the meter’s error', () => {
    fc.assert(
      fc.property(
        arbitraryHarness(),
        fc.double({ min: -1, max: 1, noNaN: true }),
        (harness, off) => {
          const circuit = harness.circuits[0]!.id;
          const { amps } = expectedLoad(harness, circuit);
          const reading = Math.max(0, amps + off * 0.05);
          const { kind } = ampsVerdict(harness, circuit, [], reading);
          return kind === 'asExpected' || kind === 'tooCoarse';
        },
      ),
    );
  });
});
