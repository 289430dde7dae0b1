import type { Sourced } from './sourced';

export interface BulbFilament {
  /** At which `amps` holds. */
  volts: number;
  amps: number;
  watts: number;
}

export type BulbUse =
  | 'stop'
  | 'turn'
  | 'tail'
  | 'plate'
  | 'marker'
  | 'clearance'
  | 'identification'
  | 'dome'
  | 'indicator';

/** A filament bulb; the brightest filament comes first. */
export interface Bulb extends Sourced {
  name: string;
  scheme: 'trade number' | 'UN Regulation 37';
  filaments: readonly BulbFilament[];
  /** Where it is usually found; empty where no source says. */
  uses: readonly BulbUse[];
}

const trade = {
  scheme: 'trade number',
  source:
    'From memory of SAE J573; the layout was read in the public copy of SAE J573d (1968), these rows were not',
  standing: 'memory',
} as const;
const regulation = { scheme: 'UN Regulation 37' } as const;

/** What 12 V filament bulbs draw at their design voltage; for UN bulbs, the most they may draw at 13.5 V. */
export const BULBS: readonly Bulb[] = [
  { name: '1156', filaments: [at(12.8, 2.1)], uses: ['stop', 'turn'], ...trade },
  {
    name: '1157',
    filaments: [at(12.8, 2.1), at(14, 0.59)],
    uses: ['stop', 'turn', 'tail'],
    ...trade,
  },
  { name: '1003', filaments: [at(12.8, 0.94)], uses: ['dome'], ...trade },
  { name: '89', filaments: [at(13, 0.58)], uses: ['plate', 'marker'], ...trade },
  { name: '67', filaments: [at(13.5, 0.59)], uses: ['plate', 'marker', 'clearance'], ...trade },
  { name: '97', filaments: [at(13.5, 0.69)], uses: ['marker'], ...trade },
  { name: '168', filaments: [at(14, 0.35)], uses: ['marker'], ...trade },
  {
    name: '194',
    filaments: [at(14, 0.27)],
    uses: ['marker', 'clearance', 'identification'],
    ...trade,
  },
  { name: '1895', filaments: [at(14, 0.27)], uses: ['marker'], ...trade },
  { name: '57', filaments: [at(14, 0.24)], uses: ['indicator'], ...trade },
  {
    name: 'PY21/5W',
    filaments: [most(26.5), most(6.6)],
    uses: [],
    ...regulation,
    source: 'UN document ECE/TRANS/WP.29/GRE/2012/34; amps computed from watts at 13.5 V',
    standing: 'read',
  },
  ...(
    [
      ['P21W', [26.5]],
      ['P21/5W', [26.5, 6.6]],
      ['R10W', [11]],
      ['R5W', [5.5]],
      ['W5W', [5.5]],
      ['C5W', [5.5]],
    ] as const
  ).map(([name, watts]): Bulb => ({
    name,
    filaments: watts.map(most),
    uses: [],
    ...regulation,
    source: 'From memory; amps computed from watts at 13.5 V',
    standing: 'memory',
  })),
];

function at(volts: number, amps: number): BulbFilament {
  return { volts, amps, watts: round(volts * amps) };
}

function most(watts: number): BulbFilament {
  return { volts: 13.5, amps: round(watts / 13.5), watts };
}

function round(value: number): number {
  return Math.round(value * 100) / 100;
}
