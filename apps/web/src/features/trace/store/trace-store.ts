import type { TraceDto } from '@lampwright/contracts';
import {
  appendEvent,
  nextSeq,
  type Refusal,
  type TraceEvent,
  type TraceEventBody,
  type TraceLog,
  type TraceRecord,
} from '@lampwright/trace';
import { StorageError } from '../../../lib/storage';
import { createTraceActor, type TraceActor } from './create-trace-actor';
import { failureOf } from './failure-of';
import { Outbox, type Keeper, type RefusedEvent } from './outbox';
import { Sender, type SenderState } from './sender';
import type { TraceApi } from './trace-api';

export interface TraceStoreDeps {
  api: TraceApi;
  keeper: Keeper;
  device: string;
  /** Id of the person who records. */
  person: string;
  newId: () => string;
  now: () => Date;
  later: (run: () => void, milliseconds: number) => () => void;
}

/** How an attempt to record something ended. */
export type Recorded = 'recorded' | 'refused' | 'notKept';

export interface SyncState extends SenderState {
  refused: RefusedEvent[];
  /** What the newest attempt to record met; gone with the next that succeeds. */
  problem: Refusal | 'notKept' | null;
}

/**
 * One trace on this device. What a person says is first written to the outbox, then folded into the actor, then sent.
 * After a refusal by the server the state is what the server has; the refused tail stays to be read.
 */
export class TraceStore {
  private actor: TraceActor;
  private sync: SyncState;
  private readonly listeners = new Set<() => void>();
  private readonly outbox: Outbox;
  private readonly sender: Sender;
  /** Recording goes one at a time, so that sequence numbers and the fold keep their order. */
  private queue: Promise<unknown> = Promise.resolve();

  private constructor(
    private readonly deps: TraceStoreDeps,
    /** What the server is known to have. */
    private known: TraceRecord,
    pending: TraceEvent[],
    refused: RefusedEvent[],
  ) {
    this.outbox = new Outbox(deps.keeper, known.id);
    this.actor = createTraceActor(withEvents(known, pending));
    this.sync = { waiting: pending.length, sending: false, failure: null, refused, problem: null };
    this.sender = new Sender({
      outbox: this.outbox,
      append: (events) => deps.api.append(known.id, events),
      failureOf,
      later: deps.later,
      onConfirmed: (events) => {
        this.known = withEvents(this.known, events);
      },
      onRefused: (tail) => this.startOver(tail),
      onChange: (state) => this.change(state),
    });
  }

  /** Opens a trace with what this device still holds of it folded on top. */
  static async open(deps: TraceStoreDeps, dto: Pick<TraceDto, 'record'>): Promise<TraceStore> {
    const outbox = new Outbox(deps.keeper, dto.record.id);
    const [pending, refused] = await Promise.all([outbox.pending(), outbox.refused()]);
    const store = new TraceStore(deps, dto.record, pending, refused);
    void store.send();
    return store;
  }

  readonly getActor = (): TraceActor => this.actor;
  readonly getSync = (): SyncState => this.sync;
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => {
      this.listeners.delete(listener);
    };
  };

  /** Records one event. A refusal by the rules, or a device that cannot store, is an answer and also a `problem`. */
  readonly record = (body: TraceEventBody): Promise<Recorded> => {
    const recorded = this.queue.then(() => this.recordNow(body));
    this.queue = recorded;
    return recorded;
  };

  /** Sends what waits. */
  readonly send = (): Promise<void> => this.sender.kick();

  /** The person has read what the server refused. */
  readonly forgetRefused = async (): Promise<void> => {
    await this.outbox.forgetRefused();
    this.change({ refused: [] });
  };

  readonly close = (): void => {
    this.sender.stop();
    this.actor.stop();
  };

  private async recordNow(body: TraceEventBody): Promise<Recorded> {
    const event = this.envelope(body);
    const appended = appendEvent(this.log(), event);
    if (!appended.ok) {
      this.change({ problem: appended.refusal });
      return 'refused';
    }
    try {
      await this.outbox.add(event);
    } catch (error) {
      if (!(error instanceof StorageError)) throw error;
      this.change({ problem: 'notKept' });
      return 'notKept';
    }
    this.actor.send(event);
    this.change({ waiting: this.sync.waiting + 1, problem: null });
    void this.send();
    return 'recorded';
  }

  private envelope(body: TraceEventBody): TraceEvent {
    const { device, person, newId, now } = this.deps;
    const seq = nextSeq(this.log(), device);
    return { ...body, id: newId(), device, seq, at: now().toISOString(), by: person };
  }

  private log(): TraceLog {
    return this.actor.getSnapshot().context.log;
  }

  /**
   * Goes on from what the server has, asked afresh, since another device may have written. It queues with the recording,
   * so that nothing is recorded on a state that is about to go.
   */
  private startOver(tail: RefusedEvent[]): Promise<void> {
    const done = this.queue.then(async () => {
      try {
        this.known = (await this.deps.api.read(this.known.id)).record;
      } catch (error) {
        // What the server is known to have is the best there is; the next load reads it again.
        this.change({ failure: failureOf(error) });
      }
      const refused = await this.outbox.refused();
      this.actor.stop();
      this.actor = createTraceActor(withEvents(this.known, await this.outbox.pending()));
      this.change({ refused: refused.length > 0 ? refused : tail });
    });
    this.queue = done;
    return done;
  }

  private change(part: Partial<SyncState>): void {
    this.sync = { ...this.sync, ...part };
    for (const listener of this.listeners) listener();
  }
}

/** The record with events added that it does not have yet. */
function withEvents(record: TraceRecord, events: readonly TraceEvent[]): TraceRecord {
  const known = new Set(record.events.map(({ id }) => id));
  return { ...record, events: [...record.events, ...events.filter(({ id }) => !known.has(id))] };
}
