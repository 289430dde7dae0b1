import { finishedTraces } from './finishedTraces';
import type { DemoTrace } from './finishedTraces';
import { people } from './people';
import type { DemoPerson } from './people';
import { plans } from './plans';
import type { DemoPlan } from './plans';
import { fleets, trailers } from './trailers';
import type { DemoTrailer } from './trailers';

export interface DemoYard {
  name: string;
  fleets: readonly string[];
  people: readonly DemoPerson[];
  trailers: readonly DemoTrailer[];
  plans: readonly DemoPlan[];
  finishedTraces: readonly DemoTrace[];
}

/** An invented yard to try the program on: people without passwords, trailers, and a plan for each. */
export const demoYard: DemoYard = {
  name: 'Thornwick Yard',
  fleets,
  people: Object.values(people),
  trailers: Object.values(trailers),
  plans: Object.values(plans),
  finishedTraces,
};
