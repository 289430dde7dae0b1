import type { TraceSummaryDto } from '@lampwright/contracts';
import { useMemo } from 'react';
import { useTraces } from '../../lib/api/traces';

export interface Facet {
  value: string;
  label: string;
}

function distinct(pairs: [value: string, label: string][]): Facet[] {
  return [...new Map(pairs)]
    .map(([value, label]) => ({ value, label }))
    .sort((a, b) => a.label.localeCompare(b.label, 'en', { numeric: true }));
}

const circuitsOf = ({ circuits, circuitNames }: TraceSummaryDto): [string, string][] =>
  circuits.map((id, at) => [id, circuitNames[at] ?? id]);

/** The people, trailers and circuits of the hundred newest traces: what is worth filtering by. */
export function useTraceFacets() {
  const { data } = useTraces({ sort: '-openedAt', size: 100 });
  return useMemo(() => {
    const items = data?.items ?? [];
    return {
      people: distinct(items.map(({ author }) => [author.id, author.name])),
      trailers: distinct(items.map(({ trailer }) => [trailer.id, trailer.unit])),
      circuits: distinct(items.flatMap(circuitsOf)),
    };
  }, [data]);
}
