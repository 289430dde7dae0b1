import type { PartDraft } from './drafts';
import type { FaultList } from './faultList';

/** Judges each part by itself, and that there is one inlet. */
export function judgeParts(parts: readonly PartDraft[], faults: FaultList): void {
  for (const part of parts) judgePart(part, faults);
  const inlets = parts.filter((part) => part.kind === 'inlet');
  const others = inlets.map((part) => part.id).filter((id) => id !== undefined);
  const [, second] = inlets;
  if (second) {
    const id = second.id === undefined ? undefined : { id: second.id };
    faults.add({
      code: 'severalInlets',
      path: second.path,
      ...id,
      found: inlets.length,
      wanted: 1,
      others,
    });
  } else if (inlets.length === 0 && parts.every((part) => part.kind !== undefined)) {
    faults.add({ code: 'noInlet', path: 'parts', found: 0, wanted: 1 });
  }
}

function judgePart(part: PartDraft, faults: FaultList): void {
  const { path, kind } = part;
  if (kind === undefined) return;
  const id = part.id === undefined ? undefined : { id: part.id };
  if (part.separable && (kind === 'inlet' || kind === 'splice')) {
    const code = kind === 'inlet' ? 'inletSeparable' : 'spliceSeparable';
    faults.add({ code, path: `${path}.separable`, ...id });
  }
  for (const data of ['lamp', 'module'] as const) {
    if (kind === data && !part[data]) {
      const code = data === 'lamp' ? 'lampWithoutData' : 'moduleWithoutData';
      faults.add({ code, path: `${path}.${data}`, ...id });
    }
    if (kind !== data && part[data]) {
      faults.add({ code: 'strayData', path: `${path}.${data}`, ...id, found: data, wanted: kind });
    }
  }
}
