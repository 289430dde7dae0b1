import { useTranslation } from 'react-i18next';

/** The catalogue of the trace screens, and `common:` for what all screens share. */
export function useTraceWords() {
  return useTranslation(['trace', 'common']).t;
}

export type TraceWords = ReturnType<typeof useTraceWords>;
