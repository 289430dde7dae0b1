import type {
  OpenTraceRequest,
  Page,
  TraceDto,
  TraceListQuery,
  TraceSummaryDto,
} from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

const tracesKey = (query: TraceListQuery) => ['traces', query] as const;
export const useTraces = (query: TraceListQuery | null) =>
  useSWR(query === null ? null : tracesKey(query), () =>
    api.get<Page<TraceSummaryDto>>('traces', query ?? {}),
  );

export const openTrace = (body: OpenTraceRequest) => api.post<TraceDto>('traces', body);
