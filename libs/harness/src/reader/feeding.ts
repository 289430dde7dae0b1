import type { PartDraft } from './drafts';
import type { FaultList } from './faultList';
import type { Wiring } from './wiring';

/** Judges that every part is wired, and that its loads and the circuits that feed it agree. */
export function judgeFeeding(parts: readonly PartDraft[], wiring: Wiring, faults: FaultList): void {
  const fed = new Map<string, Set<string>>();
  const wired = new Map<string, Set<string>>();
  for (const [circuit, edges] of wiring.edges) {
    for (const { from, to } of edges) {
      addTo(fed, to, circuit);
      addTo(wired, to, circuit);
      addTo(wired, from, circuit);
    }
  }
  for (const part of parts) {
    if (part.id === undefined || !wiring.partById.has(part.id)) continue;
    const circuits = wired.get(part.id);
    if (circuits) judgeLoads(part, fed.get(part.id) ?? new Set(), circuits, wiring, faults);
    else if (part.kind !== 'inlet' && wiring.hasInlet && !wiring.anyIncomplete) {
      faults.add({ code: 'unreachable', path: part.path, id: part.id, found: 1 });
    }
  }
}

function judgeLoads(
  { path, id, kind, loads }: PartDraft,
  fed: ReadonlySet<string>,
  wired: ReadonlySet<string>,
  wiring: Wiring,
  faults: FaultList,
): void {
  if (!loads || id === undefined) return;
  for (const [index, { circuit }] of loads.list.entries()) {
    if (!wired.has(circuit) && wiring.circuits.has(circuit) && !wiring.incomplete(circuit)) {
      faults.add({ code: 'loadWithoutFeed', path: `${loads.path}[${index}]`, id, circuit });
    }
  }
  // A module may take a circuit through without drawing on it; a lamp may not.
  if (kind !== 'lamp') return;
  const drawn = new Set(loads.list.map((load) => load.circuit));
  for (const circuit of fed) {
    if (!drawn.has(circuit))
      faults.add({ code: 'loadMissing', path: `${path}.lamp.loads`, id, circuit });
  }
}

function addTo(sets: Map<string, Set<string>>, key: string, value: string): void {
  const set = sets.get(key);
  if (set) set.add(value);
  else sets.set(key, new Set([value]));
}
