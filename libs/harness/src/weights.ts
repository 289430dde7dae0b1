import type { Part, PartKind, Run } from './harness';

/**
 * How likely each kind of part is to hold the short, relative to one another, where a plan does not say. Common
 * practice, no source: no public data say where shorts occur. A shop's own history replaces them.
 */
export const DEFAULT_PART_WEIGHT: Readonly<Record<PartKind, number>> = {
  inlet: 1,
  plug: 2,
  splice: 1,
  lamp: 3,
  module: 2,
};

/** Relative weight of one metre of run, on the scale of `DEFAULT_PART_WEIGHT`. Common practice, no source. */
export const DEFAULT_RUN_WEIGHT_PER_METRE = 0.1;

/** Relative weight of a fault in the whole part. */
export function partWeight(part: Part): number {
  return part.faultWeight ?? DEFAULT_PART_WEIGHT[part.kind];
}

/** Relative weight of a fault in the whole run. */
export function runWeight(run: Run): number {
  return run.faultWeight ?? DEFAULT_RUN_WEIGHT_PER_METRE * run.metres;
}
