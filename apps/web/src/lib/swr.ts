import type { SWRConfiguration } from 'swr';
import { isWorthRetrying } from './api-error';
import { reachability } from './reachability';

/** How office screens read: three retries, none after a plain no, and the old rows until the new ones are there. */
export const swrConfig: SWRConfiguration = {
  errorRetryCount: 3,
  shouldRetryOnError: isWorthRetrying,
  keepPreviousData: true,
  isOnline: () => reachability.get() || navigator.onLine,
  revalidateOnFocus: true,
  focusThrottleInterval: 30_000,
};
