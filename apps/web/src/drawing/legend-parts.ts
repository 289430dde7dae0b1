import type { Part } from '@lampwright/harness';

const KINDS = ['inlet', 'plug', 'splice', 'module', 'lamp'] as const;

/** One part of each shape that the drawing has, in the order of the key. */
export function legendParts(parts: readonly Part[]): Part[] {
  const byShape = new Map<string, Part>();
  for (const kind of KINDS) {
    for (const part of parts) {
      if (part.kind !== kind) continue;
      const shape = [kind, part.lamp?.colour, part.lamp?.technology].join(' ');
      if (!byShape.has(shape)) byShape.set(shape, part);
    }
  }
  return [...byShape.values()];
}
