import type { Planner } from '@lampwright/isolation';
import { cautionsLeft } from '../cautions';
import { circuitsToProve } from '../circuits';
import type { Meaning, TraceEventBody } from '../events';
import { meaningsFor, placesLeft } from '../meanings';
import { own } from '../own';
import { samePlace } from '../places';
import { pointsToCloseFirst } from '../pointsToCloseFirst';
import { isUnchanged } from '../powerUps';
import { lampsToCheck } from '../selectors/lists';
import { isAt, stepOf } from '../selectors/stepOf';
import { situation } from '../situation';
import type { TraceContext } from '../state';
import type { TraceLog } from '../traceLog';
import type { PlayedTrailer } from './PlayedTrailer';
import type { TraceStory } from './story';

/** How often the harness is moved before nothing is said to be wrong. */
const WIGGLES = 5;

/** Someone who does what the program asks and says truthfully what they see. */
export class Player {
  private wiggles = 0;

  constructor(
    private readonly story: TraceStory,
    private readonly trailer: PlayedTrailer,
    private readonly planner: Planner,
  ) {}

  /** The next event, or `null` once the trace has ended. */
  move(log: TraceLog): TraceEventBody | null {
    const { context } = log.snapshot;
    switch (stepOf(log)) {
      case 'intake':
        return this.state();
      case 'makeSafe':
        return makeSafe(context);
      case 'confirm':
        return isAt(log, 'nothingWrong') ? this.wiggle(context) : this.confirm(context);
      case 'narrow':
        return this.narrow(log);
      case 'inspect':
        return this.inspect(context);
      case 'repair':
        return this.repair(context);
      case 'prove':
        return this.prove(context);
      case 'reconnect':
        return { type: 'point.reconnected', point: context.open[0] ?? '' };
      case 'lampCheck':
        return this.checkLamps(context);
      case 'sign':
        return this.sign(log);
      case 'signed':
      case 'abandoned':
        return null;
    }
  }

  private state(): TraceEventBody {
    const { complaint, circuits, feed } = this.story;
    return { type: 'intake.stated', complaint, circuits, feed };
  }

  private confirm(context: TraceContext): TraceEventBody {
    const circuit = context.suspects.find((each) => !own(context.confirmed, each));
    if (circuit === undefined) return { type: 'confirm.finished' };
    const outcome = this.trailer.power(context, circuit, []);
    return { type: 'circuit.confirmed', circuit, outcome };
  }

  private wiggle(context: TraceContext): TraceEventBody {
    const circuit = context.suspects[this.wiggles % context.suspects.length];
    if (circuit === undefined || this.wiggles >= WIGGLES) return { type: 'nothing.found' };
    this.wiggles += 1;
    const outcome = this.trailer.power(context, circuit, []);
    return { type: 'wiggle.read', circuit, outcome };
  }

  private narrow(log: TraceLog): TraceEventBody {
    const { context } = log.snapshot;
    if (isAt(log, 'coolDown')) return { type: 'coolDown.taken' };
    if (isAt(log, 'contradicted')) {
      return { type: 'contradiction.explained', meaning: this.meaning(context) };
    }
    const { circuit } = context;
    const question = situation(context)?.question;
    const plan = question && this.planner.plan(question);
    if (circuit === null || plan?.kind !== 'powerUp') return { type: 'inspection.started' };
    const { open } = plan.advice;
    if (isUnchanged(context, circuit, open)) return { type: 'inspection.started' };
    const outcome = this.trailer.power(context, circuit, open);
    return { type: 'reading.taken', circuit, open, outcome, advised: open };
  }

  /** What contradicting readings really mean on this trailer. */
  private meaning(context: TraceContext): Meaning {
    const meanings = meaningsFor(context);
    const several = this.trailer.left(context, context.circuit ?? '').length > 1;
    const order: Meaning[] = several ? ['secondShort', 'comesAndGoes'] : ['comesAndGoes'];
    return order.find((meaning) => meanings.includes(meaning)) ?? 'planIsWrong';
  }

  private inspect(context: TraceContext): TraceEventBody {
    const rated = situation(context)?.placesInQuestion ?? [];
    const left = placesLeft(context);
    const place =
      rated.find(({ ref }) => left.some((each) => samePlace(each, ref)))?.ref ?? left[0];
    if (!place) return { type: 'narrowing.resumed' };
    const short = this.trailer.shortAt(context, context.circuit ?? '', place);
    return { type: 'place.inspected', place, method: 'look', finding: short ? 'found' : 'clear' };
  }

  private repair(context: TraceContext): TraceEventBody {
    const short =
      context.found && this.trailer.shortAt(context, context.circuit ?? '', context.found);
    if (!short) throw new Error('A played trace repairs only what is hidden in it.');
    const { place, cause, correction, parts } = short;
    return { type: 'repair.made', place, cause, correction, parts };
  }

  private prove(context: TraceContext): TraceEventBody {
    const [circuit = ''] = circuitsToProve(context);
    const [point] = pointsToCloseFirst(context, circuit);
    if (point !== undefined) return { type: 'point.reconnected', point };
    const outcome = this.trailer.power(context, circuit, context.open);
    return { type: 'proof.read', circuit, outcome };
  }

  private checkLamps(context: TraceContext): TraceEventBody {
    for (const { circuit, outcome, lamps } of lampsToCheck(context)) {
      if (outcome === null) {
        const seen = this.trailer.power(context, circuit, []);
        return { type: 'circuit.powered', circuit, outcome: seen };
      }
      const unseen = lamps.filter(({ result }) => result === null);
      const dark = this.story.dark?.find(({ lamp }) =>
        unseen.some((each) => each.lamp.id === lamp),
      );
      if (dark) return { type: 'lamp.checked', circuit, result: 'dark', ...dark };
      if (unseen.length > 0) return { type: 'circuit.allLit', circuit };
    }
    return { type: 'lampCheck.finished' };
  }

  private sign(log: TraceLog): TraceEventBody {
    const { record, snapshot, effective } = log;
    const { repairs } = snapshot.context;
    const last = Date.parse(effective.at(-1)?.at ?? record.openedAt);
    return {
      type: 'trace.signed',
      name: this.story.name,
      cause: repairs.map(({ cause }) => cause).join(' ') || 'Nothing found.',
      correction: repairs.map(({ correction }) => correction).join(' '),
      minutes: Math.ceil((last - Date.parse(record.openedAt)) / 60_000),
      parts: repairs.flatMap(({ parts }) => parts),
    };
  }
}

function makeSafe(context: TraceContext): TraceEventBody {
  const [caution] = cautionsLeft(context);
  return caution ? { type: 'caution.ticked', caution } : { type: 'safety.confirmed' };
}
