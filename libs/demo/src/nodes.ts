import type { LampColour, LampTechnology, PartId } from '@lampwright/harness';
import type { Wire } from './circuits';
import type { Handling } from './handling';
import type { Feeds } from './lampLoads';

/** The part that feeds a part: one for all its circuits, or one for each. */
export type Feeder = PartId | Partial<Record<Wire, PartId>>;

/** Metres along, across, up, as in the plan document. */
export type At = readonly [along: number, across: number, up: number];

/** What every part but the inlet says. The circuits it carries follow from the loads behind it. */
export interface Node {
  id: PartId;
  label: string;
  at: At;
  where: string;
  from: Feeder;
  /** Length of the run that leads here; by default the way along, across and up, with some slack. */
  metres?: number;
  /** Size of the run that leads here; by default 14 to plugs and splices, 16 to lamps. */
  awg?: number;
  faultWeight?: number;
  /** Circuits that end here without a load, as in a socket for what is towed behind. */
  ends?: readonly Wire[];
}

export interface LampNode extends Node {
  colour: LampColour;
  /** The circuit that feeds each function of the housing. */
  feeds: Feeds;
  /** Absent where the lamp is riveted or spliced in. */
  handling?: Handling;
  technology?: LampTechnology;
}

export interface ModuleNode extends Node {
  loads: Partial<Record<Wire, number>>;
  handling?: Handling;
}
