import type { PartKind, PlaceRef } from '@lampwright/harness';
import { useTraceContext } from '../../store/trace-session';

/** What a place is, so that the right things to look for can be said. */
export function useKindOf(): (place: PlaceRef) => PartKind | 'run' {
  const parts = useTraceContext((context) => context.record.plan.harness.parts);
  return (place) => {
    if (place.kind === 'run') return 'run';
    return parts.find(({ id }) => id === place.id)?.kind ?? 'splice';
  };
}
