import type { DocumentDraft, PartDraft, RunDraft } from './drafts';
import type { FaultList } from './faultList';

/** The ids that a document gives to its circuits and parts, as far as they can be relied on. */
export interface Identity {
  /** `undefined` when the list could not be read. */
  circuits: ReadonlySet<string> | undefined;
  parts: ReadonlySet<string> | undefined;
  /** Part ids given more than once: what refers to them cannot be told apart. */
  twiceParts: ReadonlySet<string>;
}

/** Judges ids and references: each id once in its kind, each reference to something that is there. */
export function judgeIdentity(document: DocumentDraft, faults: FaultList): Identity {
  const circuits = document.circuits && judgeIds(document.circuits, faults);
  const parts = document.parts && judgeIds(document.parts, faults);
  if (document.runs) judgeIds(document.runs, faults);
  for (const part of document.parts ?? []) judgeLoads(part, circuits?.ids, faults);
  for (const run of document.runs ?? []) judgeRun(run, circuits?.ids, parts?.ids, faults);
  return { circuits: circuits?.ids, parts: parts?.ids, twiceParts: parts?.twice ?? new Set() };
}

function judgeIds(
  drafts: readonly { path: string; id?: string | undefined }[],
  faults: FaultList,
): { ids: Set<string>; twice: Set<string> } {
  const ids = new Set<string>();
  const twice = new Set<string>();
  for (const { path, id } of drafts) {
    if (id === undefined) continue;
    if (ids.has(id)) {
      twice.add(id);
      faults.add({ code: 'duplicateId', path: `${path}.id`, id, found: id });
    }
    ids.add(id);
  }
  return { ids, twice };
}

function judgeLoads(
  { id, loads }: PartDraft,
  circuits: ReadonlySet<string> | undefined,
  faults: FaultList,
): void {
  const named = new Set<string>();
  for (const [index, { circuit }] of (loads?.list ?? []).entries()) {
    const path = `${loads?.path}[${index}].circuit`;
    if (named.has(circuit)) {
      faults.add({ code: 'duplicateLoad', path, ...owner(id), found: circuit, circuit });
    } else if (circuits && !circuits.has(circuit)) addUnknown(path, id, circuit, faults);
    named.add(circuit);
  }
}

function judgeRun(
  run: RunDraft,
  circuits: ReadonlySet<string> | undefined,
  parts: ReadonlySet<string> | undefined,
  faults: FaultList,
): void {
  for (const end of ['from', 'to'] as const) {
    const part = run[end];
    if (part !== undefined && parts && !parts.has(part)) {
      addUnknown(`${run.path}.${end}`, run.id, part, faults);
    }
  }
  const named = new Set<string>();
  for (const [index, circuit] of run.circuits.entries()) {
    const path = `${run.path}.circuits[${index}]`;
    if (named.has(circuit)) {
      faults.add({ code: 'duplicateCircuit', path, ...owner(run.id), found: circuit, circuit });
    } else if (circuits && !circuits.has(circuit)) {
      addUnknown(path, run.id, circuit, faults);
    }
    named.add(circuit);
  }
}

function addUnknown(path: string, id: string | undefined, found: string, faults: FaultList): void {
  faults.add({ code: 'unknownReference', path, ...owner(id), found });
}

function owner(id: string | undefined): { id: string } | undefined {
  return id === undefined ? undefined : { id };
}
