import { OTHERS_SHOWN, type HarnessFault } from '../faults';

/** A document with more faults than this is not read to its end: nobody repairs it fault by fault. */
export const FAULT_LIMIT = 1000;

const TEXT_SHOWN = 100;

/** Gathers the faults of one document, and keeps each one small whatever the document holds. */
export class FaultList {
  readonly faults: HarnessFault[] = [];

  /** True once there are more than `FAULT_LIMIT`; whoever reads may then stop. */
  get full(): boolean {
    return this.overflowed;
  }

  private overflowed = false;

  add(fault: HarnessFault): void {
    if (this.faults.length === FAULT_LIMIT) {
      this.overflowed = true;
      return;
    }
    const { found, id, circuit, others } = fault;
    this.faults.push({
      ...fault,
      ...(typeof found === 'string' && { found: shorten(found) }),
      ...(id !== undefined && { id: shorten(id) }),
      ...(circuit !== undefined && { circuit: shorten(circuit) }),
      ...(others && { others: others.slice(0, OTHERS_SHOWN).map(shorten) }),
    });
  }
}

function shorten(text: string): string {
  return text.length > TEXT_SHOWN ? `${text.slice(0, TEXT_SHOWN)}…` : text;
}
