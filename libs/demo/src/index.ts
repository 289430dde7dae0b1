export { demoYard } from './demoYard';
export type { DemoYard } from './demoYard';
export type { DemoShort, DemoTrace } from './finishedTraces';
export type { DemoPerson } from './people';
export type { DemoPlan } from './plans';
export type { DemoTrailer } from './trailers';
