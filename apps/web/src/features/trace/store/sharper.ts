import type { Advice } from '@lampwright/isolation';

/** Rounding allowed between a play and the bound that proves it, in seconds. */
const PROVEN_WITHIN = 1e-6;

/**
 * The same points with the better figures of two thoughts. A play that was found stays found, so the shorter one counts;
 * a bound holds for every order of work, so the highest of them counts, also that of a thought on other points.
 */
export function sharper(shown: Advice, figures: Advice, other: Advice): Advice {
  const { expectedSeconds, worstSeconds } =
    figures.expectedSeconds < shown.expectedSeconds ? figures : shown;
  const lowerBoundSeconds = Math.min(
    expectedSeconds,
    Math.max(shown.lowerBoundSeconds, figures.lowerBoundSeconds, other.lowerBoundSeconds),
  );
  const proven = expectedSeconds - lowerBoundSeconds <= PROVEN_WITHIN;
  return {
    ...shown,
    expectedSeconds,
    worstSeconds,
    lowerBoundSeconds,
    proof: proven ? 'optimal' : 'notProven',
  };
}
