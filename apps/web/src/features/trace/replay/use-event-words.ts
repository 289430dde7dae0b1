import type { TraceEvent } from '@lampwright/trace';
import { useTraceContext } from '../store/trace-session';
import { samePoints } from '../store/same-points';
import { outcomeWords } from '../words/outcome-words';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

/** People end what they type with a stop or without; the sentence around it has its own. */
const bare = (typed: string) => typed.trim().replace(/[.\s]+$/, '');

/** What an entry says, in a sentence; empty where its name says it all. */
export function useEventWords(): (event: TraceEvent) => string {
  const t = useTraceWords();
  const names = useNames();
  const feed = useTraceContext((context) => context.feed);
  const secondSources = useTraceContext((context) => context.record.trailer.secondSources);
  const sources = names.list(secondSources.map((source) => t(`source.${source}`)));
  const openWords = (open: readonly string[]) =>
    open.length === 0 ? t('page.allConnected') : t('page.open', { points: names.parts(open) });
  const outcome = (circuit: string, seen: Parameters<typeof outcomeWords>[0]) =>
    t('replay.what.confirmed', {
      circuit: names.circuit(circuit),
      outcome: outcomeWords(seen, feed, t),
    });
  return (event) => {
    switch (event.type) {
      case 'intake.stated':
        return t('replay.what.intake', {
          complaint: bare(event.complaint),
          circuits: names.list(event.circuits.map(names.circuit)),
          feed: t(`feed.${event.feed.kind}.name`),
        });
      case 'caution.ticked':
        return t(`caution.${event.caution}.text`, { sources });
      case 'circuit.confirmed':
      case 'wiggle.read':
      case 'proof.read':
      case 'circuit.powered':
        return outcome(event.circuit, event.outcome);
      case 'reading.taken': {
        const reading = t('replay.what.reading', {
          points: openWords(event.open),
          outcome: outcomeWords(event.outcome, feed, t),
        });
        const { advised } = event;
        return advised && !samePoints(advised, event.open)
          ? `${reading}. ${t('replay.advised', { points: openWords(advised) })}`
          : reading;
      }
      case 'circuit.chosen':
        return t('replay.what.chosen', { circuit: names.circuit(event.circuit) });
      case 'circuit.allLit':
        return t('replay.what.allLit', { circuit: names.circuit(event.circuit) });
      case 'point.barred':
        return t('replay.what.barred', {
          point: names.part(event.point),
          reason: t(`narrow.bar.${event.reason}`),
        });
      case 'point.allowed':
      case 'point.reconnected':
        return names.part(event.point);
      case 'powerUp.chosen':
        return openWords(event.open);
      case 'damage.seen':
        return names.place(event.place);
      case 'contradiction.explained':
        return t(`contradiction.meaning.${event.meaning}`);
      case 'feed.changed':
        return t(`feed.${event.feed.kind}.name`);
      case 'place.inspected':
        return t('replay.what.place', {
          place: names.place(event.place),
          what: t(`replay.what.${event.finding}`),
        });
      case 'repair.made':
        return t('replay.what.repair', {
          place: names.place(event.place),
          cause: bare(event.cause),
          correction: bare(event.correction),
        });
      case 'lamp.checked':
        return t('replay.what.lamp', {
          lamp: names.part(event.lamp),
          result: t(`lampCheck.result.${event.result}`),
        });
      case 'trace.signed':
        return t('replay.what.signed', {
          name: event.name,
          cause: bare(event.cause),
          correction: bare(event.correction),
        });
      default:
        return '';
    }
  };
}
