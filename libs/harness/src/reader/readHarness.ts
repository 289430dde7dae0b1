import type { HarnessFault } from '../faults';
import { HARNESS_FORMAT, type Harness } from '../harness';
import { DEPTH_LIMIT, isTooDeep } from './depth';
import { draftDocument } from './drafts';
import { FaultList } from './faultList';
import { judgeFeeding } from './feeding';
import { judgeIdentity } from './identity';
import { judgeParts } from './parts';
import { typeName } from './shapeFaults';
import { judgeTrees } from './trees';
import { layWiring } from './wiring';

/** `more` is true when the document has further faults beyond `FAULT_LIMIT`. */
export type HarnessReading =
  { ok: true; harness: Harness } | { ok: false; faults: HarnessFault[]; more: boolean };

/**
 * Reads a plan document, or says everything that is wrong with it: one fault for each mistake, in one pass.
 *
 * - An unknown `format` is refused and nothing else is read. Keys that this program does not know are kept.
 * - Ids are unique among the circuits, among the parts and among the runs, each by themselves: a part and a run may
 *   share one.
 * - What follows from a mistake is not reported beside it. Where a run cannot be placed (an end or a circuit that is
 *   missing, unknown or not unique), nothing on its circuits is called unfed, for that run might feed it.
 * - A module may be wired to a circuit that it puts no load on; a lamp may not.
 *
 * The harness it gives is the input itself, not a copy. Never throws. O(size of the document).
 */
export function readHarness(input: unknown): HarnessReading {
  const faults = new FaultList();
  judge(input, faults);
  if (faults.faults.length > 0) return { ok: false, faults: faults.faults, more: faults.full };
  // Every property that `Harness` names has been checked above.
  return { ok: true, harness: input as Harness };
}

function judge(input: unknown, faults: FaultList): void {
  if (!isDocument(input)) {
    faults.add({ code: 'wrongType', path: '', found: typeName(input), wanted: 'object' });
    return;
  }
  const { format } = input;
  if (format !== HARNESS_FORMAT) {
    const found = typeof format === 'string' ? format : typeName(format);
    const fault = { path: 'format', wanted: HARNESS_FORMAT };
    if (format === undefined) faults.add({ code: 'missing', ...fault });
    else faults.add({ code: 'wrongFormat', ...fault, found });
    return;
  }
  if (isTooDeep(input)) {
    faults.add({ code: 'tooDeep', path: '', wanted: DEPTH_LIMIT });
    return;
  }
  const document = draftDocument(input, faults);
  if (faults.full) return;
  const identity = judgeIdentity(document, faults);
  if (document.parts) judgeParts(document.parts, faults);
  const wiring = layWiring(document, identity, faults);
  judgeTrees(wiring, faults);
  judgeFeeding(document.parts ?? [], wiring, faults);
}

function isDocument(input: unknown): input is { format?: unknown } {
  return typeof input === 'object' && input !== null && !Array.isArray(input);
}
