/** Preece's constants, in amperes by inch^1.5. Read in a public table. */
export const PREECE = {
  copper: 10244,
  aluminium: 7585,
  iron: 3148,
  tin: 1642,
  lead: 1379,
} as const;

const MM_PER_INCH = 25.4;

/** Copper melts at this many °C. From memory. */
const COPPER_MELTS = 1083;

/** Amps that in the end melt a bare wire in still air: C d^1.5 (Preece). `diameterMm` is of the metal. */
export function preeceAmps(diameterMm: number, constant: number = PREECE.copper): number {
  return constant * (diameterMm / MM_PER_INCH) ** 1.5;
}

/**
 * Amps that melt a copper wire in a given time, with no heat leaving it: A √(log10((Tm − Ta) / (234 + Ta) + 1) / (33 t))
 * (Onderdonk), A in circular mils. For seconds, not minutes.
 */
export function onderdonkAmps(
  circularMils: number,
  seconds: number,
  ambientCelsius: number,
): number {
  const heat = (COPPER_MELTS - ambientCelsius) / (234 + ambientCelsius) + 1;
  return circularMils * Math.sqrt(Math.log10(heat) / (33 * seconds));
}

/** The cross-section of a wire of so many mm2 in circular mils: a circle one thousandth of an inch wide is one. */
export function circularMils(areaMm2: number): number {
  return (areaMm2 / (Math.PI / 4)) * (1000 / MM_PER_INCH) ** 2;
}
