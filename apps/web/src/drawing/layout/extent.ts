import type { Part } from '@lampwright/harness';
import type { DrawingTrailer } from '../marks';

/** The trailer as a rectangle in metres. */
export interface Extent {
  length: number;
  width: number;
  /** True where the length was inferred from the parts. */
  inferred: boolean;
}

const SHORTEST = 2;
const NARROWEST = 1.6;

/**
 * The trailer's size: as given, but never smaller than its parts reach; else just around the parts. Metres.
 */
export function extentOf(parts: readonly Part[], trailer?: DrawingTrailer): Extent {
  const reach = Math.max(0, ...parts.map((part) => part.at.along));
  const side = 2 * Math.max(0, ...parts.map((part) => Math.abs(part.at.across)));
  const { lengthMetres, widthMetres } = trailer ?? {};
  return {
    length:
      lengthMetres === undefined ? Math.max(reach + 0.1, SHORTEST) : Math.max(lengthMetres, reach),
    width:
      widthMetres === undefined ? Math.max(side + 0.1, NARROWEST) : Math.max(widthMetres, side),
    inferred: lengthMetres === undefined,
  };
}
