import { METRIC_WIRES } from '@lampwright/harness';
import { AIRCRAFT_WIRES } from './aircraftWires';
import { conductorOhms } from './conductors';
import { ohmsAt, perMetre } from './copper';
import { distanceToShort, murrayLoop } from './distanceToShort';
import { circularMils, onderdonkAmps, preeceAmps } from './fusing';
import { adiabaticK, adiabaticMm2, ALUMINIUM, celsiusAfter, COPPER, withstand } from './heating';
import { hotLength, loadedCelsius, voltageDrop } from './voltageDrop';

const FOOT = 0.3048;

/** Ohm per metre of the circular's wire. */
const aircraft = (awg: number) => perMetre(AIRCRAFT_WIRES.get(awg)!);

describe('FAA AC 43.13-1B (change 1, 27 September 2001), read', () => {
  it.each([
    // No. 12: the table prints 3.60; 0.00202 × 88 × 20 is 3.5552.
    { awg: 6, feet: 107, amps: 20, printed: 0.942 },
    { awg: 4, feet: 90, amps: 20, printed: 0.504 },
    { awg: 12, feet: 88, amps: 20, printed: 3.5552 },
    { awg: 14, feet: 100, amps: 20, printed: 6.12 },
  ])('Table 11-7: $feet ft of No. $awg at $amps A', ({ awg, feet, amps, printed }) => {
    expect(voltageDrop(aircraft(awg), feet * FOOT, amps)).toBeCloseTo(printed, 3);
  });

  it.each([
    { feet: 39, drop: 0.98 },
    // The circular prints .366: a misprint. 0.00126 × 19.5 × 20 is 0.4914.
    { feet: 19.5, drop: 0.4914 },
    { feet: 156, drop: 3.93 },
    { feet: 273, drop: 6.88 },
  ])('Table 11-8: $feet ft of No. 10 at 20 A', ({ feet, drop }) => {
    expect(Math.abs(voltageDrop(aircraft(10), feet * FOOT, 20) - drop)).toBeLessThan(0.005);
  });

  it('Figure 11-2, example 1: 20 A over 50 ft for 1 V lies between No. 10 and No. 8', () => {
    // The drops are recomputed; the circular prints the sizes.
    expect(voltageDrop(aircraft(8), 50 * FOOT, 20)).toBeCloseTo(0.7, 10);
    expect(voltageDrop(aircraft(10), 50 * FOOT, 20)).toBeCloseTo(1.26, 10);
  });

  it('Example 2: 26 A rated, 20 A flowing through 200 °C wire in 50 °C air, 15.5 ft', () => {
    // Symbols of the formula read; the values recomputed. 47 A × 0.91 for height × 0.6 for the bundle: 42.77, then 26.
    const height = 47 * 0.91;
    expect(height).toBeCloseTo(42.77, 2);
    const mostAmps = Math.round(height * 0.6);
    expect(mostAmps).toBe(26);
    const celsius = loadedCelsius(50, 200, 20, mostAmps);
    expect(celsius).toBeCloseTo(181.6, 1);
    expect(hotLength(15.5, Math.round(celsius))).toBeCloseTo(9.47, 2);
  });

  it.each([
    [70, 0.8358],
    [105, 0.7496],
    [150, 0.6619],
  ])('hot length at %d °C (formula read, ratio recomputed)', (celsius, ratio) => {
    expect(hotLength(1, celsius)).toBeCloseTo(ratio, 4);
  });

  it('aluminium: 258.1 / (238.1 + T)', () => {
    expect(hotLength(1, 100, 238.1)).toBeCloseTo(258.1 / 338.1, 12);
  });
});

describe('IEC 60228, class 5 plain copper, from two public pages', () => {
  it.each([
    [0.5, 39],
    [0.75, 26],
    [1, 19.5],
    [1.5, 13.3],
    [2.5, 7.98],
    [4, 4.95],
    [6, 3.3],
  ])('%d mm2 reads at most %d milliohm a metre', (mm2, milliohm) => {
    const ohms = conductorOhms({ mm2 });
    expect(ohms.most * 1000).toBeCloseTo(milliohm, 10);
    expect(ohms.standing).toBe('secondary');
    expect(METRIC_WIRES.some((wire) => wire.source === ohms.source)).toBe(true);
  });

  it.each([
    // The next sizes of the standard are not in the tables: the computed bound must reach them.
    [10, 1.91],
    [16, 1.21],
  ])('%d mm2, outside the tables, is bounded', (mm2, milliohm) => {
    const { least, most } = conductorOhms({ mm2 });
    expect(least * 1000).toBeLessThan(milliohm);
    expect(most * 1000).toBeGreaterThan(milliohm);
  });

  it('factor from 50 °C to 20 °C: 0.893', () => {
    // The standard reckons with 0.004 a kelvin, copper has 0.00393: 0.2 % apart at 50 °C.
    expect(1 / (1 + 0.004 * 30)).toBeCloseTo(0.893, 3);
    expect(1 / ohmsAt(1, 50)).toBeCloseTo(0.8945, 4);
  });
});

describe('distance to a short', () => {
  it.each([
    // Recomputed: d = R / r with 0.100 ohm and the return along the frame.
    [0.75, 3.846],
    [1.5, 7.519],
    [2.5, 12.531],
  ])('0.100 ohm on %d mm2', (mm2, metres) => {
    expect(distanceToShort(0.1, conductorOhms({ mm2 }).usual)).toBeCloseTo(metres, 3);
  });

  it('0.1224 ohm around two No. 14 wires: 20 ft (recomputed with Table 11-9)', () => {
    expect(distanceToShort(0.1224, aircraft(14), 'conductor') / FOOT).toBeCloseTo(20, 10);
  });

  it('Murray loop, Hawkins Electrical Guide 3, figure 597, read: 1.09 miles', () => {
    // A = 332 of 1000, loop 54.07 ohm, 16.46 ohm a mile.
    expect(murrayLoop(54.07 / 16.46, 332, 1000 - 332)).toBeCloseTo(1.0906, 5);
  });

  it('Murray loop of equal wires: 300 m, arms 2 and 1 ohm: 200 m from the end of the 2 ohm arm', () => {
    // Data read in an examination question; answer recomputed.
    expect(murrayLoop(2 * 300, 1, 2)).toBeCloseTo(200, 10);
  });
});

describe('fusing currents', () => {
  it.each([
    // Recomputed from 10244 A / in^1.5.
    [1, 80.02],
    [0.5, 28.29],
    [2, 226.3],
  ])('Preece: copper of %d mm', (mm, amps) => {
    expect(Math.abs(preeceAmps(mm) - amps)).toBeLessThan(0.05);
  });

  it.each([
    // Read in a public table: diameters in inches.
    [1, 0.0021],
    [10, 0.0098],
    [20, 0.0156],
    [100, 0.0457],
    [300, 0.095],
  ])('Preece: %d A melt a copper wire of %d inch', (amps, inch) => {
    const exact = (amps / preeceAmps(25.4)) ** (2 / 3);
    expect(Math.abs(exact - inch)).toBeLessThan(0.00006);
  });

  it('Preece: 16 AWG, 0.0524 inch, 123 A (read in a discussion)', () => {
    expect(preeceAmps(0.0524 * 25.4)).toBeCloseTo(122.9, 1);
  });

  it('Onderdonk: 2581 circular mils, 5 s, 25 °C: 168.9 A', () => {
    // The published example prints 178 A: it has 234 - 25 = 209 under the line where 234 + 25 = 259 belongs.
    expect(onderdonkAmps(2581, 5, 25)).toBeCloseTo(168.9, 1);
    const misprinted = 2581 * Math.sqrt(Math.log10(1058 / 209 + 1) / (33 * 5));
    expect(misprinted).toBeCloseTo(178, 0);
  });

  it('Onderdonk: No. 14, 4110 circular mils, carries 400 A for 2.26 s (recomputed)', () => {
    expect(onderdonkAmps(4110, 2.26, 25)).toBeCloseTo(400, 0);
    expect(circularMils(conductorOhms({ awg: 14 }).areaMm2)).toBeCloseTo(4110, -1);
  });
});

describe('adiabatic heating', () => {
  it.each([
    // k = 115, 143, 76, 94 read; the formula and its constants read; the second decimals recomputed.
    ['copper in PVC', COPPER, 70, 160, 115.0],
    ['copper in XLPE', COPPER, 90, 250, 143.08],
    ['aluminium in PVC', ALUMINIUM, 70, 160, 76.03],
    ['aluminium in XLPE', ALUMINIUM, 90, 250, 94.48],
  ] as const)('k of %s', (_, metal, start, end, k) => {
    expect(adiabaticK(metal, start, end)).toBeCloseTo(k, 2);
  });

  it('3000 A for 0.4 s need 16.5 mm2, 12 000 A for 0.02 s 11.9 mm2 (read; decimals recomputed)', () => {
    expect(adiabaticMm2(3000, 0.4, 115)).toBeCloseTo(16.499, 3);
    expect(adiabaticMm2(12000, 0.02, 143)).toBeCloseTo(11.868, 3);
  });

  it.each([
    // Recomputed: k² S², and the seconds at 100 A.
    [0.75, 7439, 0.744],
    [1, 13225, 1.3225],
    [1.5, 29756, 2.976],
    [2.5, 82656, 8.266],
    [4, 211600, 21.16],
  ])('%d mm2 stands %d A²s', (mm2, squared, seconds) => {
    expect(Math.round(withstand(mm2, 1).seconds)).toBe(squared);
    const at100 = withstand(mm2, 100);
    expect(at100.seconds).toBeCloseTo(seconds, 3);
    expect(at100.valid).toBe(seconds <= 5);
  });

  it('reaches 160 °C from 70 °C when the time that PVC stands is over', () => {
    const { seconds } = withstand(1.5, 100, adiabaticK(COPPER, 70, 160));
    expect(celsiusAfter(1.5, 100, seconds, 70)).toBeCloseTo(160, 9);
  });
});
