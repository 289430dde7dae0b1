import type { TraceTrailer } from '@lampwright/trace';
import { demoId } from './demoId';
import { plans } from './plans';

export interface DemoTrailer extends TraceTrailer {
  lengthMetres: number;
  widthMetres: number;
  year: number;
  plate: string | null;
  fleet: string;
  notes: string;
  planId: string;
}

/** The fleets whose trailers the yard keeps. Invented. */
export const fleets = ['Quillmoor Freight', 'Brackenloft Lines', 'Saltmarsh Bulk'] as const;

/** Eight trailers of different build and age. */
export const trailers = {
  dryVan: {
    id: demoId('trailer', 1),
    unit: 'T-118',
    bodyType: 'dryVan',
    lengthMetres: 16.15,
    widthMetres: 2.59,
    year: 2021,
    plate: 'ZQ 4418 T',
    fleet: 'Quillmoor Freight',
    notes: 'Swing doors. Harness clips were renewed behind the landing gear in spring.',
    secondSources: [],
    abs: true,
    planId: plans.dryVan.id,
  },
  flatbed: {
    id: demoId('trailer', 2),
    unit: 'F-204',
    bodyType: 'flatbed',
    lengthMetres: 14.63,
    widthMetres: 2.59,
    year: 2004,
    plate: 'ZQ 2073 T',
    fleet: 'Brackenloft Lines',
    notes: 'Filament lamps throughout. Nose box cover has one screw missing.',
    secondSources: [],
    abs: true,
    planId: plans.flatbed.id,
  },
  pup: {
    id: demoId('trailer', 3),
    unit: 'P-031',
    bodyType: 'pup',
    lengthMetres: 8.53,
    widthMetres: 2.59,
    year: 2017,
    plate: 'ZQ 3310 T',
    fleet: 'Quillmoor Freight',
    notes: 'Runs as the lead or the rear of a set. Lift gate with its own battery.',
    secondSources: ['liftGate'],
    abs: true,
    planId: plans.pup.id,
  },
  containerChassis: {
    id: demoId('trailer', 4),
    unit: 'C-077',
    bodyType: 'containerChassis',
    lengthMetres: 12.19,
    widthMetres: 2.44,
    year: 2012,
    plate: null,
    fleet: 'Brackenloft Lines',
    notes: 'Lamps are riveted into steel boxes. Slider set to the rear hole.',
    secondSources: [],
    abs: true,
    planId: plans.containerChassis.id,
  },
  refrigerated: {
    id: demoId('trailer', 5),
    unit: 'R-412',
    bodyType: 'refrigerated',
    lengthMetres: 16.15,
    widthMetres: 2.59,
    year: 2019,
    plate: 'ZQ 5127 T',
    fleet: 'Quillmoor Freight',
    notes: 'Cooling unit with its own battery and electric standby: keep clear of its cables.',
    secondSources: ['refrigeration', 'battery'],
    abs: true,
    planId: plans.refrigerated.id,
  },
  carHauler: {
    id: demoId('trailer', 6),
    unit: 'H-559',
    bodyType: 'carHauler',
    lengthMetres: 16.15,
    widthMetres: 2.59,
    year: 2018,
    plate: 'ZQ 6640 T',
    fleet: 'Brackenloft Lines',
    notes: 'Two decks, raise and pin the upper deck before working under it.',
    secondSources: ['battery'],
    abs: true,
    planId: plans.carHauler.id,
  },
  tank: {
    id: demoId('trailer', 7),
    unit: 'K-303',
    bodyType: 'tank',
    lengthMetres: 12.8,
    widthMetres: 2.59,
    year: 2016,
    plate: 'ZQ 7005 T',
    fleet: 'Saltmarsh Bulk',
    notes:
      'Carries solvent. Power-ups only once it is certified clean and gas-free, outside this program.',
    secondSources: [],
    abs: true,
    planId: plans.tank.id,
  },
  utility: {
    id: demoId('trailer', 8),
    unit: 'U-016',
    bodyType: 'utility',
    lengthMetres: 4.88,
    widthMetres: 1.98,
    year: 2010,
    plate: 'ZQ 0166 T',
    fleet: 'Saltmarsh Bulk',
    notes: 'Yard trailer, under 80 in wide.',
    secondSources: [],
    abs: false,
    planId: plans.utility.id,
  },
} as const satisfies Record<string, DemoTrailer>;
