import {
  indexHarness,
  type CircuitId,
  type Harness,
  type PartId,
  type PlaceRef,
} from '@lampwright/harness';
import type { TraceWords } from './use-trace-words';

/** What things of one plan are called on the screen. */
export interface Names {
  circuit: (id: CircuitId) => string;
  /** With its contact and colour: "Clearance (pin 2, black)". */
  circuitWithPin: (id: CircuitId) => string;
  part: (id: PartId) => string;
  /** A part as briefly as its label allows: its leading code, as "P3", else the whole. */
  code: (id: PartId) => string;
  /** Where to find a part, in the plan's words; empty where the plan says nothing. */
  where: (id: PartId) => string;
  place: (ref: PlaceRef) => string;
  /** "P2, P3 and P5". */
  list: (labels: readonly string[]) => string;
  parts: (ids: readonly PartId[]) => string;
}

/** An id that the plan does not have is shown as it stands: a record may be older than what is drawn. */
export function createNames(harness: Harness, t: TraceWords): Names {
  const { circuitById, partById, runById } = indexHarness(harness);
  const part = (id: PartId) => partById.get(id)?.label ?? id;
  const circuit = (id: CircuitId) => circuitById.get(id)?.name ?? id;
  const list = (labels: readonly string[]) => {
    const last = labels.at(-1) ?? '';
    if (labels.length < 2) return last;
    return t('narrow.and', { list: labels.slice(0, -1).join(', '), last });
  };
  return {
    circuit,
    circuitWithPin: (id) => {
      const { pin, colour } = circuitById.get(id) ?? {};
      const marks = [pin === undefined ? null : t('page.pin', { pin }), colour].filter(Boolean);
      return marks.length > 0 ? `${circuit(id)} (${marks.join(', ')})` : circuit(id);
    },
    part,
    code: (id) => /^\p{Lu}{1,3}-?\d{1,3}[a-z]?(?=\s|$)/u.exec(part(id))?.[0] ?? part(id),
    where: (id) => partById.get(id)?.where ?? '',
    place: (ref) => {
      if (ref.kind === 'run') {
        const run = runById.get(ref.id);
        return run ? t('place.run', { from: part(run.from), to: part(run.to) }) : ref.id;
      }
      if (!ref.half) return part(ref.id);
      return t(ref.half === 'feed' ? 'place.feedHalf' : 'place.loadHalf', { part: part(ref.id) });
    },
    list,
    parts: (ids) => list(ids.map(part)),
  };
}
