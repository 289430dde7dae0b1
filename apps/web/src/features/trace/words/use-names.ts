import { useMemo } from 'react';
import { useTraceContext } from '../store/trace-session';
import { createNames, type Names } from './create-names';
import { useTraceWords } from './use-trace-words';

export function useNames(): Names {
  const t = useTraceWords();
  const harness = useTraceContext((context) => context.record.plan.harness);
  return useMemo(() => createNames(harness, t), [harness, t]);
}
