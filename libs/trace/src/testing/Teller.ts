import { appendEvent, nextSeq } from '../appendEvent';
import { cautionsLeft } from '../cautions';
import type { TraceEvent, TraceEventBody } from '../events';
import type { Feed } from '../feed';
import type { TraceRecord } from '../record';
import { stepOf } from '../selectors/stepOf';
import type { Refusal, Step, TraceContext } from '../state';
import { openTrace, type TraceLog } from '../traceLog';
import { newRecord } from './newRecord';

export const seriesLamp: Feed = { kind: 'seriesLamp', atHand: true };
export const fuse: Feed = { kind: 'fuse', atHand: false };

/** Tells a trace event by event, the way a test reads best: what happens must be accepted, or must be refused. */
export class Teller {
  log: TraceLog;

  constructor(record: TraceRecord = newRecord()) {
    this.log = openTrace(record);
  }

  get context(): TraceContext {
    return this.log.snapshot.context;
  }

  get step(): Step {
    return stepOf(this.log);
  }

  /** The event that would come next with this body. */
  event(body: TraceEventBody): TraceEvent {
    const seq = nextSeq(this.log, 'tablet');
    const minute = String(seq).padStart(2, '0');
    return {
      ...body,
      id: `00000000-0000-7000-8000-${String(seq).padStart(12, '0')}`,
      device: 'tablet',
      seq,
      at: `2026-11-02T${String(8 + Math.floor(seq / 60)).padStart(2, '0')}:${String(Number(minute) % 60).padStart(2, '0')}:00.000Z`,
      by: 'person-1',
    };
  }

  /** Events that must all be accepted. */
  says(...bodies: TraceEventBody[]): this {
    for (const body of bodies) {
      const outcome = appendEvent(this.log, this.event(body));
      if (!outcome.ok) {
        throw new Error(`${body.type} was refused: ${JSON.stringify(outcome.refusal)}`);
      }
      this.log = outcome.log;
    }
    return this;
  }

  /** An event that must be refused; gives the refusal. */
  refused(body: TraceEventBody): Refusal {
    const outcome = appendEvent(this.log, this.event(body));
    if (outcome.ok) throw new Error(`${body.type} was accepted`);
    return outcome.refusal;
  }

  /** Takes back the newest event that stands. */
  undo(): this {
    return this.says({ type: 'event.undone', target: this.log.effective.at(-1)!.id });
  }

  /** Intake and make safe, up to confirming. */
  starts(circuits: string[] = ['tail'], feed: Feed = seriesLamp): this {
    this.says({
      type: 'intake.stated',
      complaint: 'Fuse blows with the lights on',
      circuits,
      feed,
    });
    for (const caution of cautionsLeft(this.context))
      this.says({ type: 'caution.ticked', caution });
    return this.says({ type: 'safety.confirmed' });
  }

  /** As `starts`, and every circuit overloads with everything connected. */
  narrows(circuits: string[] = ['tail'], feed: Feed = seriesLamp): this {
    this.starts(circuits, feed);
    for (const circuit of circuits) {
      this.says({ type: 'circuit.confirmed', circuit, outcome: 'overload' });
    }
    return this.says({ type: 'confirm.finished' });
  }

  /** A reading on the circuit that is being narrowed. */
  reads(outcome: 'overload' | 'holds' | 'flickers', ...open: string[]): this {
    return this.says({ type: 'reading.taken', circuit: this.context.circuit!, open, outcome });
  }

  /** Powers every circuit of the lamp check, all lit, and signs. */
  finishes(): this {
    for (const { id } of this.context.record.plan.harness.circuits) {
      this.says({ type: 'circuit.powered', circuit: id, outcome: 'holds' });
      this.says({ type: 'circuit.allLit', circuit: id });
    }
    return this.says(
      { type: 'lampCheck.finished' },
      {
        type: 'trace.signed',
        name: 'Sam Okafor',
        cause: 'Chafed run',
        correction: 'Run replaced',
        minutes: 25,
        parts: [],
      },
    );
  }
}
