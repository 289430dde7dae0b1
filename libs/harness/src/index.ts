export { HARNESS_FORMAT } from './harness';
export type * from './harness';
export type { HarnessFault, HarnessFaultCode } from './faults';
export type { Place, PlaceRef, Section, SectionTree, SeparablePoint } from './sections';
