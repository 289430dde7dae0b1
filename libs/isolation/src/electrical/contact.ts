/** What is believed of a short's own ohms, where the bare metal touches. */
export interface ContactOhms {
  /** Below this all contacts are alike. */
  hard: number;
  most: number;
}

/**
 * A short that trips or blows is hard; one that does not, a wet connector or a chafed strand, has ohms to kilohms. Even
 * over the orders of magnitude between. Ours, no source.
 */
export const CONTACT_UNDER_POWER: ContactOhms = { hard: 0.01, most: 1000 };

/** A short that has shown an overload, then looked at with a meter. Ours, no source. */
export const CONTACT_OF_OVERLOAD: ContactOhms = { hard: 0.01, most: 10 };

/**
 * Probability that the contact's ohms lie between two bounds, which may be negative or infinite: even over log(1 + ohms
 * / hard) from 0 to `most`.
 */
export function contactBetween(low: number, high: number, { hard, most }: ContactOhms): number {
  const below = (ohms: number) =>
    Math.log1p(Math.min(Math.max(ohms, 0), most) / hard) / Math.log1p(most / hard);
  return high < 0 ? 0 : Math.max(0, below(high) - below(low));
}
