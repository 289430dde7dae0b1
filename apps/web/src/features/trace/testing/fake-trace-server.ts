import type { AppendResult, TraceDto } from '@lampwright/contracts';
import { appendEvent, openTrace, stepOf, type TraceRecord } from '@lampwright/trace';
import type { TraceApi } from '../store/trace-api';

/** A server with the real rules and no network; `down` makes each request fail with what it is set to. */
export function fakeTraceServer(record: TraceRecord) {
  let log = openTrace(record);
  const server = {
    down: null as unknown,
    /** Loses the answer of the next append, after it was taken. */
    loseAnswer: false,
    requests: 0,
    record: () => log.record,
    /** Another device writes. */
    replace: (next: TraceRecord) => {
      log = openTrace(next);
    },
    api: {
      read: async () => {
        if (server.down) throw server.down;
        return { record: log.record, writable: true } as TraceDto;
      },
      append: async (_id, events) => {
        server.requests += 1;
        if (server.down) throw server.down;
        let stopped = false;
        const results = events.map((event): AppendResult => {
          if (stopped) {
            return { id: event.id, outcome: 'refused', refusal: { reason: 'outOfSequence' } };
          }
          const outcome = appendEvent(log, event);
          if (!outcome.ok) {
            stopped = true;
            return { id: event.id, outcome: 'refused', refusal: outcome.refusal };
          }
          log = outcome.log;
          return { id: event.id, outcome: outcome.duplicate ? 'duplicate' : 'accepted' };
        });
        if (server.loseAnswer) {
          server.loseAnswer = false;
          throw new TypeError('The connection was cut.');
        }
        return { results, step: stepOf(log) };
      },
    } satisfies TraceApi,
  };
  return server;
}
