/** A conductor's metal, as the adiabatic formula takes it. */
export interface Metal {
  /** Heat capacity and resistivity in one: ampere root second per mm2. */
  factor: number;
  /** Kelvin from 0 °C down to where its resistance would vanish. */
  constant: number;
}

/**
 * Read in a public page on the adiabatic formula. Copper's factor also follows from 3.45e-3 J/(K mm3) and 17.241e-6 ohm
 * mm: 225.67.
 */
export const COPPER: Metal = { factor: 226, constant: 234.5 };
export const ALUMINIUM: Metal = { factor: 148, constant: 228 };

/** Copper in PVC, from 70 °C in service to 160 °C, which it stands once. Read. */
export const PVC_K = 115;

/** Longer than this heat leaves the wire, so that the adiabatic figures are too low. */
export const ADIABATIC_SECONDS = 5;

/** The adiabatic k of a metal between two temperatures: factor × √ln((constant + end) / (constant + start)). */
export function adiabaticK(metal: Metal, startCelsius: number, endCelsius: number): number {
  const { factor, constant } = metal;
  return factor * Math.sqrt(Math.log((constant + endCelsius) / (constant + startCelsius)));
}

/** The least cross-section in mm2 that stands a current for a time: I √t / k. */
export function adiabaticMm2(amps: number, seconds: number, k: number): number {
  return (amps * Math.sqrt(seconds)) / k;
}

/** Seconds that a cross-section stands a current: k² S² / I². `valid` up to `ADIABATIC_SECONDS`. */
export function withstand(
  areaMm2: number,
  amps: number,
  k: number = PVC_K,
): { seconds: number; valid: boolean } {
  const seconds = ((k * areaMm2) / amps) ** 2;
  return { seconds, valid: seconds <= ADIABATIC_SECONDS };
}

/**
 * Temperature in °C of a conductor after a current, with no heat leaving it; valid up to `ADIABATIC_SECONDS`. Infinity
 * stands for a wire that is long gone.
 */
export function celsiusAfter(
  areaMm2: number,
  amps: number,
  seconds: number,
  startCelsius: number,
  { factor, constant }: Metal = COPPER,
): number {
  const exponent = (amps / (factor * areaMm2)) ** 2 * seconds;
  return (constant + startCelsius) * Math.exp(exponent) - constant;
}
