import type { CircuitId, Harness, Load, Part, PartId } from './harness';

/** What a part draws, circuit by circuit: a lamp's or a module's loads; none for any other part. */
export function loadsOf(part: Part): readonly Load[] {
  return part.lamp?.loads ?? part.module?.loads ?? [];
}

/**
 * Amps at nominal voltage that a healthy circuit draws while exactly these parts are energised, for comparison with an
 * ammeter. Ids of parts that draw nothing, or that the plan does not have, count nothing. O(parts).
 */
export function expectedAmps(
  harness: Harness,
  circuit: CircuitId,
  energised: Iterable<PartId>,
): number {
  const on = new Set(energised);
  let amps = 0;
  for (const part of harness.parts) {
    if (!on.has(part.id)) continue;
    for (const load of loadsOf(part)) if (load.circuit === circuit) amps += load.amps;
  }
  return amps;
}
