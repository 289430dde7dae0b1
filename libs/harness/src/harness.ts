/** The plan document, `lampwright-harness/1`: one JSON object that says how one trailer's lighting is wired. */

export const HARNESS_FORMAT = 'lampwright-harness/1';

export type CircuitId = string;
export type PartId = string;
export type RunId = string;

export type ProtectionKind = 'auto-reset' | 'manual-reset' | 'fuse' | 'electronic';

export interface Circuit {
  id: CircuitId;
  name: string;
  /** Contact number in the supply connector. */
  pin?: number;
  /** Conductor colour, in words. */
  colour?: string;
  protection?: { amps: number; kind: ProtectionKind };
}

/** A position in metres. */
export interface Position {
  /** From the front of the trailer, rearwards. */
  along: number;
  /** From the centre line: negative is road side, positive is curb side (right-hand traffic). */
  across: number;
  /** Above the ground. */
  up?: number;
}

export type PartKind = 'inlet' | 'plug' | 'splice' | 'lamp' | 'module';

/** Seconds of reaching and opening (closing) a part once a person stands at it; walking is not in it. */
export interface Separable {
  openSeconds: number;
  closeSeconds: number;
}

/** Amps at the nominal voltage that a part draws from one circuit. */
export interface Load {
  circuit: CircuitId;
  amps: number;
}

export type LampColour = 'amber' | 'red' | 'white';
export type LampTechnology = 'led' | 'filament';

export interface Lamp {
  loads: Load[];
  technology: LampTechnology;
  colour?: LampColour;
  /** What the lamp is for: `tail`, `stop`, `clearance`, `side-marker`, ... */
  functions?: string[];
}

export interface Part {
  id: PartId;
  kind: PartKind;
  label: string;
  at: Position;
  /** A sentence that helps a person find it. */
  where?: string;
  /** Present only where a person can open the part by hand. */
  separable?: Separable;
  /** Relative weight of a fault here; the default depends on the kind. */
  faultWeight?: number;
  lamp?: Lamp;
  module?: { loads: Load[] };
}

export type Conductor = { awg: number } | { mm2: number };

export interface Run {
  id: RunId;
  /** The part on the feed side. */
  from: PartId;
  to: PartId;
  circuits: CircuitId[];
  metres: number;
  conductor?: Conductor;
  /** Relative weight of a fault in the whole run; by default 0.1 for each metre. */
  faultWeight?: number;
}

export interface Harness {
  format: typeof HARNESS_FORMAT;
  name: string;
  supply: { volts: 12 | 24; connector: string };
  circuits: Circuit[];
  parts: Part[];
  runs: Run[];
}
