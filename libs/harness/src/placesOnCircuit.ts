import type { CircuitId, Harness } from './harness';
import type { Place } from './sections';
import { sectionTree, type SectionOptions } from './sectionTree';

/**
 * Every place of the circuit that can hold the fault, section by section, with its weight; a separable plug gives two.
 * O(parts + runs).
 *
 * @throws UnknownCircuitError
 */
export function placesOnCircuit(
  harness: Harness,
  circuit: CircuitId,
  options?: SectionOptions,
): Place[] {
  return sectionTree(harness, circuit, options).sections.flatMap((section) => section.places);
}
