import {
  contextOf,
  type TraceContext,
  type TraceEventBody,
  type TraceLog,
} from '@lampwright/trace';
import { useSelector } from '@xstate/react';
import { createContext, useContext } from 'react';
import type { TraceActor } from './create-trace-actor';
import type { TraceStore } from './trace-store';

/**
 * What the screens of one trace stand on. `store` is `null` where the trace is only read: then nothing can be
 * recorded, and `actor` shows the record as it stood after some event.
 */
export interface TraceSession {
  store: TraceStore | null;
  actor: TraceActor;
}

const SessionContext = createContext<TraceSession | null>(null);

export const TraceSessionProvider = SessionContext.Provider;

export function useTraceSession(): TraceSession {
  const session = useContext(SessionContext);
  if (!session) throw new Error('useTraceSession is used outside of a TraceSessionProvider.');
  return session;
}

/** A part of the trace and its events; what selects it answers with the same thing while the trace is the same. */
export function useTraceLog<Selected>(select: (log: TraceLog) => Selected): Selected {
  const { actor } = useTraceSession();
  return useSelector(actor, (snapshot) => select(snapshot.context.log));
}

/** The part of what is known that a component shows; it renders again only when that part changes. */
export function useTraceContext<Selected>(select: (context: TraceContext) => Selected): Selected {
  return useTraceLog((log) => select(contextOf(log)));
}

/**
 * Records what a person said; `true` once it is kept. Where a trace is only read there is nothing to record, and the
 * screens show no button that would.
 */
export function useRecord(): (body: TraceEventBody) => Promise<boolean> {
  const { store } = useTraceSession();
  return async (body) => (await store?.record(body)) === 'recorded';
}
