import type {
  AppendEventsRequest,
  AppendEventsResponse,
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

/** Not through SWR: what is captured in a trace is kept on the device and folded on top. */
export const getTrace = (id: string) => api.get<TraceDto>(`traces/${id}`);

export const openTrace = (body: OpenTraceRequest) => api.post<TraceDto>('traces', body);

export const appendEvents = (id: string, body: AppendEventsRequest) =>
  api.post<AppendEventsResponse>(`traces/${id}/events`, body);
