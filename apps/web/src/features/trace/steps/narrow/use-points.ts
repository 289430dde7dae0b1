import type { Part, PartId } from '@lampwright/harness';
import { situation, type BarReason } from '@lampwright/trace';
import { useMemo } from 'react';
import { useTraceContext } from '../../store/trace-session';

export interface Points {
  /** The points of the circuit that can be opened now, front to rear. */
  parts: Part[];
  pickable: ReadonlySet<PartId>;
  barred: { part: Part; reason: BarReason }[];
}

/** The points of the circuit being narrowed. */
export function usePoints(): Points {
  const tree = useTraceContext((context) => situation(context)?.tree ?? null);
  const parts = useTraceContext((context) => context.record.plan.harness.parts);
  const barred = useTraceContext((context) => context.barred);
  return useMemo(() => {
    const pickable = new Set(tree?.sections.flatMap(({ point }) => (point ? [point.partId] : [])));
    return {
      parts: parts
        .filter(({ id }) => pickable.has(id))
        .sort((a, b) => a.at.along - b.at.along || a.at.across - b.at.across),
      pickable,
      barred: barred.flatMap(({ point, reason }) => {
        const part = parts.find(({ id }) => id === point);
        return part ? [{ part, reason }] : [];
      }),
    };
  }, [tree, parts, barred]);
}
