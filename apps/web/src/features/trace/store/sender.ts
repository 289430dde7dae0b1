import type { AppendEventsResponse, AppendResult } from '@lampwright/contracts';
import type { TraceEvent } from '@lampwright/trace';
import type { Outbox, RefusedEvent } from './outbox';

/** Why events are still on this device. `offline` covers every passing failure: no route, a timeout, a server in trouble. */
export type SendFailure = 'offline' | 'signIn' | 'turnedAway';

export interface SenderDeps {
  outbox: Outbox;
  append: (events: TraceEvent[]) => Promise<AppendEventsResponse>;
  failureOf: (error: unknown) => SendFailure;
  /** Events that the server now has. */
  onConfirmed: (events: TraceEvent[]) => void;
  /** Events set aside because the server refused the first of them. */
  onRefused: (refused: RefusedEvent[]) => Promise<void>;
  onChange: (state: SenderState) => void;
  /** Calls back after some milliseconds; returns what cancels it. */
  later: (run: () => void, milliseconds: number) => () => void;
}

export interface SenderState {
  waiting: number;
  sending: boolean;
  failure: SendFailure | null;
}

/** Small enough for a slow line, large enough for a day without signal in a few requests. */
const BATCH = 50;
const FIRST_PAUSE = 2_000;
const LONGEST_PAUSE = 60_000;

/** Sends the outbox in order, one batch at a time, and tries again with growing pauses. */
export class Sender {
  private running: Promise<void> | null = null;
  private again = false;
  private stopped = false;
  private pause = FIRST_PAUSE;
  private cancelRetry: (() => void) | null = null;

  constructor(private readonly deps: SenderDeps) {}

  /** Sends what is there now; while a batch is under way, once more after it. */
  kick(): Promise<void> {
    this.cancelRetry?.();
    this.cancelRetry = null;
    this.again = true;
    this.running ??= this.drain().finally(() => {
      this.running = null;
    });
    return this.running;
  }

  stop(): void {
    this.stopped = true;
    this.cancelRetry?.();
  }

  private async drain(): Promise<void> {
    while (this.again && !this.stopped) {
      this.again = false;
      const failure = await this.sendAll();
      this.deps.onChange({
        waiting: (await this.deps.outbox.pending()).length,
        sending: false,
        failure,
      });
      if (failure === 'offline') this.retryLater();
      if (failure) return;
    }
  }

  private async sendAll(): Promise<SendFailure | null> {
    for (;;) {
      const pending = await this.deps.outbox.pending();
      if (pending.length === 0 || this.stopped) return null;
      this.deps.onChange({ waiting: pending.length, sending: true, failure: null });
      const batch = pending.slice(0, BATCH);
      let response: AppendEventsResponse;
      try {
        response = await this.deps.append(batch);
      } catch (error) {
        return this.deps.failureOf(error);
      }
      this.pause = FIRST_PAUSE;
      const taken = await this.settle(batch, response.results);
      // An answer that is about none of our events would have us ask for ever.
      if (taken === 0) return 'turnedAway';
    }
  }

  /** Confirms what the server has and sets aside the rest from the first refusal on. Returns how many left the outbox. */
  private async settle(batch: TraceEvent[], results: AppendResult[]): Promise<number> {
    const resultById = new Map(results.map((result) => [result.id, result]));
    const confirmed = batch.filter(({ id }) => {
      const outcome = resultById.get(id)?.outcome;
      return outcome === 'accepted' || outcome === 'duplicate';
    });
    await this.deps.outbox.confirm(confirmed.map(({ id }) => id));
    this.deps.onConfirmed(confirmed);
    const first = results.find((result) => result.outcome === 'refused');
    if (first?.outcome !== 'refused') return confirmed.length;
    const tail = await this.deps.outbox.pending();
    const refused = tail.map((event): RefusedEvent => {
      const result = resultById.get(event.id);
      return {
        event,
        refusal: result?.outcome === 'refused' ? result.refusal : { reason: 'outOfSequence' },
      };
    });
    await this.deps.outbox.setAside(refused);
    await this.deps.onRefused(refused);
    return confirmed.length + refused.length;
  }

  private retryLater(): void {
    if (this.stopped) return;
    this.cancelRetry = this.deps.later(() => void this.kick(), this.pause);
    this.pause = Math.min(this.pause * 2, LONGEST_PAUSE);
  }
}
