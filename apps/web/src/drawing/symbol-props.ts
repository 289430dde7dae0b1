import type { Part } from '@lampwright/harness';
import type { PartMarks } from './place-marks';

export interface SymbolProps {
  part: Part;
  marks: PartMarks;
  /** Side of the square it fills. */
  size: number;
  open: boolean;
  /** Degrees by which the feed side is turned from the left. */
  turn: number;
  ink: number;
}
