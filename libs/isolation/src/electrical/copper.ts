/**
 * Resistivity of standard annealed copper at 20 °C, in ohm metre. From memory (100 % IACS); it gives the AWG table of
 * `AWG_WIRES` back to 0.02 %.
 */
export const COPPER_OHM_METRES = 1.7241e-8;

/** Kelvin from 0 °C down to where copper's resistance would vanish. FAA AC 43.13-1B, page 11-22, read. */
export const COPPER_CONSTANT = 234.5;

/** Change of copper's resistance for each kelvin, of its value at 20 °C. From memory; 1 / (234.5 + 20) = 0.00393. */
const COPPER_PER_KELVIN = 0.00393;

const METRES_PER_FOOT = 0.3048;

/** Ohm per 1000 ft as ohm per metre. */
export function perMetre(ohmsPerThousandFeet: number): number {
  return ohmsPerThousandFeet / (1000 * METRES_PER_FOOT);
}

/** What a copper conductor of `ohmsAt20` reads at another temperature: R20 × (1 + 0.00393 (T − 20)). */
export function ohmsAt(ohmsAt20: number, celsius: number): number {
  return ohmsAt20 * (1 + COPPER_PER_KELVIN * (celsius - 20));
}

/** Diameter in mm of a bare AWG conductor: d = 0.127 mm × 92^((36 − n) / 39). From memory; it gives the table back. */
export function awgDiameterMm(awg: number): number {
  return 0.127 * 92 ** ((36 - awg) / 39);
}

/** Cross-section in mm2 of a round conductor. */
export function circleMm2(diameterMm: number): number {
  return (Math.PI / 4) * diameterMm ** 2;
}
