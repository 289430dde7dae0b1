import { randomUUID } from 'node:crypto';
import type { TraceEvent, TraceEventBody } from '@lampwright/trace';

/** Makes events as a tablet would: one person, one device, numbers that count up. */
export class Tablet {
  last: TraceEvent | null = null;
  private seq = 0;

  constructor(
    private readonly by: string,
    private readonly device = 'tablet-1',
  ) {}

  says(body: TraceEventBody): TraceEvent {
    this.seq += 1;
    this.last = {
      ...body,
      id: randomUUID(),
      device: this.device,
      seq: this.seq,
      at: '2026-12-01T09:00:00.000Z',
      by: this.by,
    };
    return this.last;
  }

  /** The first event of a trace. */
  intake(...circuits: string[]): TraceEvent {
    return this.says({
      type: 'intake.stated',
      complaint: 'Lamps go out',
      circuits,
      feed: { kind: 'seriesLamp', atHand: true },
    });
  }
}
