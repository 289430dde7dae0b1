import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import { ApiError, NetworkError } from './api-error';
import { StorageError } from './storage';

/** Turns anything that was thrown into a sentence that says what to do. */
export function useErrorWords(): (error: unknown) => string {
  const { t } = useTranslation('errors');
  return useCallback(
    (error: unknown) => {
      if (error instanceof ApiError) {
        const seconds = error.problem?.retryAfter;
        if (error.reason === 'tooManyRequests' && seconds) return t('waitSeconds', { seconds });
        return t(`problem.${error.reason}`);
      }
      if (error instanceof NetworkError) return t('network');
      if (error instanceof StorageError) return t(error.full ? 'storageFull' : 'storage');
      return t('unknown');
    },
    [t],
  );
}
