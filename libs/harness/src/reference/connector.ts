import type { Conductor } from '../harness';
import type { Sourced } from './sourced';

export type ContactFunction =
  | 'ground'
  | 'leftTurn'
  | 'rightTurn'
  | 'hazard'
  | 'stop'
  | 'tail'
  | 'leftTail'
  | 'rightTail'
  | 'clearance'
  | 'sideMarker'
  | 'identification'
  | 'outlineMarker'
  | 'plate'
  | 'rearFog'
  | 'reversing'
  | 'auxiliary'
  | 'antilock'
  | 'antilockPower'
  | 'trailerBrake'
  | 'continuousSupply'
  | 'switchedSupply'
  | 'trailerPresent'
  | 'brakeWearSensor'
  | 'springBrakeSensor'
  | 'axleLift'
  | 'canHigh'
  | 'canLow'
  | 'unallocated';

export interface Contact extends Sourced {
  pin: number;
  functions: readonly ContactFunction[];
  /** Conductor colour, `base/stripe`; absent where the source gives none. */
  colour?: string;
  /** DIN 72552 terminal label. */
  label?: string;
  /** For a ground: the contacts it serves, where not all. */
  groundFor?: readonly number[];
  /** The size has a source of its own. */
  size?: Conductor & Sourced;
  /** True where trailers are known to differ: which lamps hang here is never to be assumed. */
  varies?: true;
}

/** Contacts between which there must be no connection on the trailer: a bridge is itself a fault. */
export interface KeptApart extends Sourced {
  pins: readonly number[];
}

export interface Connector {
  /** As `supply.connector` of a plan names it. */
  name: string;
  /** What else people call it. */
  aliases: readonly string[];
  volts: 12 | 24;
  contacts: readonly Contact[];
  keptApart: readonly KeptApart[];
}
