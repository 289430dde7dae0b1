import { useCallback } from 'react';
import { useSWRConfig } from 'swr';

/** Fetches again everything on the screen whose key starts with one of these words. */
export function useRevalidate(): (...names: string[]) => Promise<void> {
  const { mutate } = useSWRConfig();
  return useCallback(
    async (...names: string[]) => {
      await mutate((key) => Array.isArray(key) && names.includes(String(key[0])));
    },
    [mutate],
  );
}
