import type { Load, PartKind } from '../harness';
import type { FaultList } from './faultList';
import {
  circuitShape,
  documentShape,
  loadShape,
  nameShape,
  PART_KINDS,
  partShape,
  runShape,
} from './shape';
import { checkEach, checkShape } from './shapeFaults';

/** What could be made out of one thing, well shaped or not; what has the wrong shape is left out. */
interface CircuitDraft {
  path: string;
  id?: string | undefined;
}

export interface PartDraft {
  path: string;
  id?: string | undefined;
  kind?: PartKind | undefined;
  separable: boolean;
  lamp: boolean;
  module: boolean;
  /** Where the loads that the kind calls for stand; `undefined` when there are none to judge. */
  loads?: { path: string; list: Load[] } | undefined;
}

export interface RunDraft {
  path: string;
  id?: string | undefined;
  from?: string | undefined;
  to?: string | undefined;
  /** The circuits that could be read. */
  circuits: string[];
  /** True when both ends and every circuit could be read. */
  whole: boolean;
}

/** `undefined` where the list itself is missing or no list, so that nothing is judged against it. */
export interface DocumentDraft {
  circuits?: CircuitDraft[] | undefined;
  parts?: PartDraft[] | undefined;
  runs?: RunDraft[] | undefined;
}

/** Checks the shape of the whole document and draws up what the rules can work on. */
export function draftDocument(input: object, faults: FaultList): DocumentDraft {
  const document = record(input);
  checkShape(documentShape, input, { path: '' }, faults);
  return {
    circuits: draftEach(document.circuits, 'circuits', faults, draftCircuit),
    parts: draftEach(document.parts, 'parts', faults, draftPart),
    runs: draftEach(document.runs, 'runs', faults, draftRun),
  };
}

function draftEach<Draft>(
  list: unknown,
  name: string,
  faults: FaultList,
  draft: (value: unknown, path: string, faults: FaultList) => Draft,
): Draft[] | undefined {
  if (!Array.isArray(list)) return undefined;
  const drafts: Draft[] = [];
  for (const [index, value] of list.entries()) {
    if (faults.full) break;
    drafts.push(draft(value, `${name}[${index}]`, faults));
  }
  return drafts;
}

function draftCircuit(value: unknown, path: string, faults: FaultList): CircuitDraft {
  const id = name(record(value).id);
  checkShape(circuitShape, value, { path, id }, faults);
  return { path, id };
}

function draftPart(value: unknown, path: string, faults: FaultList): PartDraft {
  const part = record(value);
  const id = name(part.id);
  const kind = PART_KINDS.find((known) => known === part.kind);
  checkShape(partShape, value, { path, id }, faults);
  const functions = record(part.lamp).functions;
  if (Array.isArray(functions)) {
    checkEach(nameShape, functions, { path: `${path}.lamp.functions`, id }, faults);
  }
  const lampLoads = draftLoads(part.lamp, `${path}.lamp.loads`, id, faults);
  const moduleLoads = draftLoads(part.module, `${path}.module.loads`, id, faults);
  return {
    path,
    id,
    kind,
    separable: part.separable !== undefined,
    lamp: part.lamp !== undefined,
    module: part.module !== undefined,
    loads: kind === 'lamp' ? lampLoads : kind === 'module' ? moduleLoads : undefined,
  };
}

function draftLoads(
  owner: unknown,
  path: string,
  id: string | undefined,
  faults: FaultList,
): PartDraft['loads'] {
  const loads = record(owner).loads;
  if (!Array.isArray(loads)) return undefined;
  const before = faults.faults.length;
  checkEach(loadShape, loads, { path, id }, faults);
  return faults.faults.length === before && !faults.full
    ? { path, list: loads as Load[] }
    : undefined;
}

function draftRun(value: unknown, path: string, faults: FaultList): RunDraft {
  const run = record(value);
  const id = name(run.id);
  checkShape(runShape, value, { path, id }, faults);
  checkConductor(run.conductor, { path: `${path}.conductor`, id }, faults);
  const circuits = Array.isArray(run.circuits) ? run.circuits : [];
  checkEach(nameShape, circuits, { path: `${path}.circuits`, id }, faults);
  const from = name(run.from);
  const to = name(run.to);
  const names = circuits.map(name).filter((circuit) => circuit !== undefined);
  const whole = from && to && names.length > 0 && names.length === circuits.length;
  return { path, id, from, to, circuits: names, whole: Boolean(whole) };
}

/** A conductor is sized one way or the other. */
function checkConductor(
  conductor: unknown,
  { path, id }: { path: string; id: string | undefined },
  faults: FaultList,
): void {
  if (typeof conductor !== 'object' || conductor === null || Array.isArray(conductor)) return;
  const { awg, mm2 } = record(conductor);
  const owner = id !== undefined && { id };
  if (awg === undefined && mm2 === undefined) {
    faults.add({ code: 'missing', path, ...owner, others: ['awg', 'mm2'] });
  } else if (awg !== undefined && mm2 !== undefined) {
    faults.add({ code: 'strayData', path: `${path}.mm2`, ...owner, found: 'mm2', wanted: 'awg' });
  }
}

function record(value: unknown): Record<string, unknown> {
  return typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {};
}

function name(value: unknown): string | undefined {
  return typeof value === 'string' && value.trim() !== '' ? value : undefined;
}
