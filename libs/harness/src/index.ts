export { circuitTree } from './circuitTree';
export type { CircuitNode, CircuitTree } from './circuitTree';
export { energisedParts, energisedSections, sectionByPlace, sectionOf } from './energised';
export { PartNotOnCircuitError, UnknownCircuitError } from './errors';
export { OTHERS_SHOWN } from './faults';
export type { HarnessFault, HarnessFaultCode } from './faults';
export { HARNESS_FORMAT } from './harness';
export type {
  Circuit,
  CircuitId,
  Conductor,
  Harness,
  Lamp,
  LampColour,
  LampTechnology,
  Load,
  Part,
  PartId,
  PartKind,
  Position,
  ProtectionKind,
  Run,
  RunId,
  Separable,
} from './harness';
export { indexHarness } from './indexHarness';
export type { HarnessIndex } from './indexHarness';
export { expectedAmps, loadsOf } from './loads';
export { parsePlaceKey, placeKey } from './placeKey';
export { placesOnCircuit } from './placesOnCircuit';
export { FAULT_LIMIT } from './reader/faultList';
export { readHarness } from './reader/readHarness';
export type { HarnessReading } from './reader/readHarness';
export { DEFAULT_MAX_BYTES, readHarnessText } from './reader/readHarnessText';
export { BULBS } from './reference/bulbs';
export type { Bulb, BulbFilament, BulbUse } from './reference/bulbs';
export { CABLES } from './reference/cables';
export type { Cable, CableConductor } from './reference/cables';
export type { Connector, Contact, ContactFunction, KeptApart } from './reference/connector';
export { connectorByName, CONNECTORS } from './reference/connectors';
export { DIN_72552 } from './reference/din72552';
export type { Terminal, TerminalMeaning } from './reference/din72552';
export { LAMP_CURRENTS } from './reference/lampCurrents';
export type { LampCurrent, LampUse } from './reference/lampCurrents';
export type { Sourced, Standing } from './reference/sourced';
export { AWG_WIRES, METRIC_WIRES } from './reference/wires';
export type { AwgWire, MetricWire } from './reference/wires';
export type { Place, PlaceRef, Section, SectionTree, SeparablePoint } from './sections';
export { sectionTree } from './sectionTree';
export type { SectionOptions } from './sectionTree';
export { downstream, lampsOnCircuit, partsOnCircuit, pathToInlet } from './walks';
export {
  DEFAULT_PART_WEIGHT,
  DEFAULT_RUN_WEIGHT_PER_METRE,
  partWeight,
  runWeight,
} from './weights';
