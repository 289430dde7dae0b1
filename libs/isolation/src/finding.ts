import type { Length } from './playOut';
import type { Step } from './situation';

/** A step found, how long the play behind it is, and whether no play can be shorter. */
export interface Finding {
  step: Step;
  length: Length;
  optimal: boolean;
}
