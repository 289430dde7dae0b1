import { appendTo } from '../appendTo';
import type { DocumentDraft, PartDraft } from './drafts';
import type { FaultList } from './faultList';
import type { Identity } from './identity';

/** One run on one circuit, between parts that are known. */
export interface Edge {
  path: string;
  run: string | undefined;
  from: string;
  to: string;
}

/** The wires of a document, circuit by circuit. */
export interface Wiring {
  edges: ReadonlyMap<string, Edge[]>;
  /** Whether a run of the circuit may be missing from `edges`; then nothing can be called unfed. */
  incomplete: (circuit: string) => boolean;
  /** Whether any run is missing from `edges`. */
  anyIncomplete: boolean;
  hasInlet: boolean;
  circuits: ReadonlySet<string>;
  /** Without those whose id is given twice. */
  partById: ReadonlyMap<string, PartDraft>;
}

/** Lays out the runs that make sense by themselves, and reports those that do not. */
export function layWiring(document: DocumentDraft, identity: Identity, faults: FaultList): Wiring {
  const partById = new Map<string, PartDraft>();
  for (const part of document.parts ?? []) {
    if (part.id !== undefined && !identity.twiceParts.has(part.id)) partById.set(part.id, part);
  }
  const edges = new Map<string, Edge[]>();
  const gaps = new Set<string>();
  let gapAnywhere = !document.runs || !document.parts;

  for (const run of document.runs ?? []) {
    const { path, id, from, to } = run;
    const circuits = new Set(run.circuits);
    const known = [...circuits].filter((circuit) => identity.circuits?.has(circuit) ?? false);
    if (!run.whole || known.length < circuits.size) gapAnywhere = true;
    if (from === undefined || to === undefined) continue;
    const subject = { path, ...(id !== undefined && { id }) };
    if (from === to) {
      faults.add({ ...subject, code: 'runToItself', found: to });
    } else if (partById.get(to)?.kind === 'inlet') {
      faults.add({ ...subject, path: `${path}.to`, code: 'runIntoInlet', found: to });
    } else if (partById.has(from) && partById.has(to)) {
      for (const circuit of known) appendTo(edges, circuit, { path, run: id, from, to });
      continue;
    }
    for (const circuit of known) gaps.add(circuit);
  }
  return {
    edges,
    incomplete: (circuit) => gapAnywhere || gaps.has(circuit),
    anyIncomplete: gapAnywhere || gaps.size > 0,
    hasInlet: (document.parts ?? []).some((part) => part.kind === 'inlet'),
    circuits: identity.circuits ?? new Set(),
    partById,
  };
}
