export { demoYard } from './demoYard';
export type { DemoYard } from './demoYard';
export { demoTraces } from './demoTraces';
export type { DemoTrace } from './finishedTraces';
export type { DemoPerson } from './people';
export type { DemoPlan } from './plans';
export type { DemoTrailer } from './trailers';
