import type { AppendEventsRequest, AppendEventsResponse, TraceDto } from '@lampwright/contracts';
import type { TraceEvent } from '@lampwright/trace';
import { api } from '../../../lib/client';

/** The server's side of one trace. Not through SWR: what is captured is kept on the device and folded on top. */
export interface TraceApi {
  read: (id: string) => Promise<TraceDto>;
  append: (id: string, events: TraceEvent[]) => Promise<AppendEventsResponse>;
}

const addressOf = (id: string) => `traces/${encodeURIComponent(id)}`;

export const traceApi: TraceApi = {
  read: (id) => api.get<TraceDto>(addressOf(id)),
  append: (id, events) =>
    api.post<AppendEventsResponse>(`${addressOf(id)}/events`, {
      events,
    } satisfies AppendEventsRequest),
};
