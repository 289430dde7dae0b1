import { COPPER_CONSTANT } from './copper';

/** Volts lost along a conductor. */
export function voltageDrop(ohmsPerMetre: number, metres: number, amps: number): number {
  return ohmsPerMetre * metres * amps;
}

/**
 * How hot a loaded wire runs: T1 + (TR − T1) √(I / Imax), from the air's T1 to the wire's rated TR at Imax. FAA AC
 * 43.13-1B, page 11-22; the symbols were read, the root's argument from memory.
 */
export function loadedCelsius(
  airCelsius: number,
  ratedCelsius: number,
  amps: number,
  mostAmps: number,
): number {
  return airCelsius + (ratedCelsius - airCelsius) * Math.sqrt(amps / mostAmps);
}

/**
 * The length of hot copper that drops as much as `length` does at 20 °C: 254.5 L / (234.5 + T), in the unit of `length`.
 * FAA AC 43.13-1B, page 11-22, read; aluminium has 238.1 for the constant.
 */
export function hotLength(length: number, celsius: number, constant = COPPER_CONSTANT): number {
  return (length * (constant + 20)) / (constant + celsius);
}
