/**
 * A belief over the sections after a piece of evidence: each probability times its likelihood, shared out to sum to 1
 * again. Exact for one short; sections without probability stay so. Evidence that denies everything changes nothing.
 * O(sections).
 */
export function reweigh(probabilities: readonly number[], likelihood: readonly number[]): number[] {
  const weights = probabilities.map(
    (probability, section) => probability * (likelihood[section] ?? 0),
  );
  const sum = weights.reduce((total, weight) => total + weight, 0);
  return sum > 0 ? weights.map((weight) => weight / sum) : [...probabilities];
}
