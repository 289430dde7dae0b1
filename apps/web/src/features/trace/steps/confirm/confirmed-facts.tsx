import { useTraceContext } from '../../store/trace-session';
import { outcomeWords } from '../../words/outcome-words';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { Facts } from '../facts';

/** Circuit by circuit, what the first power-up showed. */
export function ConfirmedFacts() {
  const t = useTraceWords();
  const names = useNames();
  const confirmed = useTraceContext((context) => context.confirmed);
  const feed = useTraceContext((context) => context.feed);
  return (
    <Facts
      facts={Object.entries(confirmed).map(([circuit, { outcome, amps }]) => ({
        key: circuit,
        name: names.circuit(circuit),
        value: [
          outcomeWords(outcome, feed, t),
          amps === undefined ? null : t('replay.what.amps', { amps }),
        ]
          .filter(Boolean)
          .join(', '),
      }))}
    />
  );
}
