import type { Sourced } from './sourced';

/** Solid annealed copper at 20 °C. Stranded automotive wire reads a few per cent higher. */
export interface AwgWire extends Sourced {
  awg: number;
  /** By the AWG rule d = 0.127 mm × 92^((36 − n) / 39). */
  diameterMm: number;
  areaMm2: number;
  /** As the source gives it. */
  ohmsPerThousandFeet: number;
  /** Converted; the same number is milliohm per metre. */
  ohmsPerKm: number;
}

const handbook: Sourced = {
  source:
    'Georgia State University, HyperPhysics, "American Wire Gages" (ohm per 1000 ft, 20 °C); diameter, area and ohm per km computed',
  standing: 'read',
};

export const AWG_WIRES: readonly AwgWire[] = [
  wire(20, 0.812, 0.518, 10.15, 33.3),
  wire(18, 1.024, 0.823, 6.385, 20.95),
  wire(16, 1.291, 1.309, 4.016, 13.18),
  wire(14, 1.628, 2.081, 2.525, 8.28),
  wire(12, 2.053, 3.309, 1.588, 5.21),
  wire(10, 2.588, 5.261, 0.9989, 3.28),
  wire(8, 3.264, 8.366, 0.6282, 2.06),
  wire(6, 4.115, 13.3, 0.3951, 1.3),
  wire(4, 5.189, 21.15, 0.2485, 0.815),
];

/** The most that plain copper of a metric size may read at 20 °C. */
export interface MetricWire extends Sourced {
  mm2: number;
  standard: 'IEC 60228 class 5' | 'ISO 6722-1';
  /** The same number is milliohm per metre. */
  mostOhmsPerKm: number;
}

const iec = {
  standard: 'IEC 60228 class 5',
  source: 'Two public pages with the table of IEC 60228, classes 5 and 6, plain copper',
  standing: 'secondary',
} as const;
const iso = { standard: 'ISO 6722-1', source: 'From memory', standing: 'memory' } as const;

export const METRIC_WIRES: readonly MetricWire[] = [
  { mm2: 0.5, mostOhmsPerKm: 39, ...iec },
  { mm2: 0.75, mostOhmsPerKm: 26, ...iec },
  { mm2: 1, mostOhmsPerKm: 19.5, ...iec },
  { mm2: 1.5, mostOhmsPerKm: 13.3, ...iec },
  { mm2: 2.5, mostOhmsPerKm: 7.98, ...iec },
  { mm2: 4, mostOhmsPerKm: 4.95, ...iec },
  { mm2: 6, mostOhmsPerKm: 3.3, ...iec },
  { mm2: 0.5, mostOhmsPerKm: 37.1, ...iso },
  { mm2: 0.75, mostOhmsPerKm: 24.7, ...iso },
  { mm2: 1, mostOhmsPerKm: 18.5, ...iso },
  { mm2: 1.5, mostOhmsPerKm: 12.7, ...iso },
  { mm2: 2.5, mostOhmsPerKm: 7.6, ...iso },
  { mm2: 4, mostOhmsPerKm: 4.71, ...iso },
  { mm2: 6, mostOhmsPerKm: 3.14, ...iso },
];

function wire(
  awg: number,
  diameterMm: number,
  areaMm2: number,
  ohmsPerThousandFeet: number,
  ohmsPerKm: number,
): AwgWire {
  return { awg, diameterMm, areaMm2, ohmsPerThousandFeet, ohmsPerKm, ...handbook };
}
