import { loadsOf, type CircuitId, type Harness, type Part } from '@lampwright/harness';

/**
 * A cold filament's resistance as a part of its hot one: "about a tenth". Read for a 60 W lamp, 200 ohm hot and 18 ohm
 * cold (University of Maryland, lecture demonstration K5-44); for 12 V bulbs from memory. The bounds are ours.
 */
export const COLD_FILAMENT = { least: 0.08, usual: 0.1, most: 0.12 } as const;

/** Amps that the part draws from the circuit at nominal voltage. */
function ampsOf(part: Part, circuit: CircuitId): number {
  return loadsOf(part).reduce((sum, load) => sum + (load.circuit === circuit ? load.amps : 0), 0);
}

/** Siemens of a part's load while it is lit: its amps at the plan's nominal voltage, as a resistance. */
export function hotSiemens(harness: Harness, circuit: CircuitId): (part: Part) => number {
  return (part) => ampsOf(part, circuit) / harness.supply.volts;
}

/**
 * Siemens of a part's load to a meter with the power off. Filaments are cold and pass ten times what they do lit; LED
 * lamps, and modules, which are electronic too, read open. `cold` is the cold resistance over the hot one.
 */
export function coldSiemens(
  harness: Harness,
  circuit: CircuitId,
  cold: number = COLD_FILAMENT.usual,
): (part: Part) => number {
  const hot = hotSiemens(harness, circuit);
  return (part) => (part.lamp?.technology === 'filament' ? hot(part) / cold : 0);
}
