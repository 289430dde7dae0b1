import type { PageQuery } from '@lampwright/contracts';
import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';

type Patch = Record<string, string | number | undefined>;

/** What a list asks for, kept in the address so that a link or the back button brings it back. */
export interface ListQuery<Filter extends string> {
  query: PageQuery & Partial<Record<Filter, string>>;
  /** Changes part of it; anything but the page itself starts at page 1 again. */
  set: (patch: Patch) => void;
  /** Whether anything narrows the list. */
  narrowed: boolean;
}

function toPage(text: string | null): number {
  const page = Number(text ?? 1);
  return Number.isInteger(page) && page > 0 ? page : 1;
}

export function useListQuery<Filter extends string = never>(
  filters: readonly Filter[],
  defaults: { sort: string; size?: number },
): ListQuery<Filter> {
  const [params, setParams] = useSearchParams();
  const { sort, size = 25 } = defaults;

  const query = useMemo(() => {
    const chosen: Partial<Record<Filter, string>> = {};
    for (const filter of filters) {
      const value = params.get(filter);
      if (value) chosen[filter] = value;
    }
    return {
      ...chosen,
      page: toPage(params.get('page')),
      size,
      search: params.get('search') ?? '',
      sort: params.get('sort') ?? sort,
    };
  }, [filters, params, size, sort]);

  const set = useCallback(
    (patch: Patch) => {
      setParams(
        (old) => {
          const next = new URLSearchParams(old);
          if (!('page' in patch)) next.delete('page');
          for (const [name, value] of Object.entries(patch)) {
            if (value === undefined || value === '') next.delete(name);
            else next.set(name, String(value));
          }
          return next;
        },
        { replace: true, preventScrollReset: true },
      );
    },
    [setParams],
  );

  const narrowed = query.search !== '' || filters.some((filter) => params.get(filter));
  return { query, set, narrowed };
}
