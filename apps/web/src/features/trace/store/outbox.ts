import type { Refusal, TraceEvent } from '@lampwright/trace';
import type { storage } from '../../../lib/storage';

/** What the trace needs of this device's store. */
export type Keeper = Pick<typeof storage, 'read' | 'write' | 'update' | 'remove'>;

/** An event that the server would not take, kept so that a person can see what it was and say it again. */
export interface RefusedEvent {
  event: TraceEvent;
  refusal: Refusal;
}

/**
 * What this device has recorded of one trace and the server has not yet confirmed. An event is written here before
 * anything else happens to it, so that a failed request, a reload or a closed lid loses nothing.
 */
export class Outbox {
  constructor(
    private readonly keeper: Keeper,
    private readonly traceId: string,
  ) {}

  async pending(): Promise<TraceEvent[]> {
    return listOf<TraceEvent>(await this.keeper.read(this.pendingKey));
  }

  async refused(): Promise<RefusedEvent[]> {
    return listOf<RefusedEvent>(await this.keeper.read(this.refusedKey));
  }

  async add(event: TraceEvent): Promise<void> {
    await this.keeper.update(this.pendingKey, (kept) => {
      const events = listOf<TraceEvent>(kept);
      return events.some(({ id }) => id === event.id) ? events : [...events, event];
    });
  }

  /** Forgets events that the server has. */
  async confirm(ids: readonly string[]): Promise<void> {
    const known = new Set(ids);
    await this.keeper.update(this.pendingKey, (kept) =>
      listOf<TraceEvent>(kept).filter(({ id }) => !known.has(id)),
    );
  }

  /** Moves events out of the way of the next ones; the refused list is written first, so that a crash keeps both. */
  async setAside(refused: readonly RefusedEvent[]): Promise<void> {
    const ids = new Set(refused.map(({ event }) => event.id));
    await this.keeper.update(this.refusedKey, (kept) => [
      ...listOf<RefusedEvent>(kept).filter(({ event }) => !ids.has(event.id)),
      ...refused,
    ]);
    await this.confirm([...ids]);
  }

  /** The person has read what was refused. */
  async forgetRefused(): Promise<void> {
    await this.keeper.remove(this.refusedKey);
  }

  private get pendingKey(): string {
    return `outbox:1:${this.traceId}`;
  }

  private get refusedKey(): string {
    return `refused:1:${this.traceId}`;
  }
}

/** The keys carry a version and this class alone writes them, so a list there is a list of ours. */
function listOf<Item>(kept: unknown): Item[] {
  return Array.isArray(kept) ? (kept as Item[]) : [];
}
