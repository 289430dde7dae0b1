import { useSyncExternalStore } from 'react';

/** Below the breakpoint `md` of the theme. */
const query = window.matchMedia('(max-width: 767px)');

function subscribe(listener: () => void): () => void {
  query.addEventListener('change', listener);
  return () => query.removeEventListener('change', listener);
}

/** Whether the screen is as narrow as a phone's. */
export function usePhone(): boolean {
  return useSyncExternalStore(subscribe, () => query.matches);
}
