import { useSyncExternalStore } from 'react';
import { createSignal } from './signal';

/** Whether the last request reached the server; `navigator.onLine` knows only of a cable or a radio. */
export const reachability = createSignal(true);

export function useReachable(): boolean {
  return useSyncExternalStore(reachability.subscribe, reachability.get);
}
