import type { CircuitId } from '@lampwright/harness';
import type { Feed } from '@lampwright/trace';
import { chakra } from '@chakra-ui/react';
import { Ask } from '../controls/panel';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

const Note = chakra('p', { base: { fontSize: 'sm', color: 'fg.muted', lineHeight: '1.3' } });

/** The question: power on, which circuit, and what is seen, in the words of the feed. */
export function PowerOn({ feed, circuit }: { feed: Feed; circuit: CircuitId }) {
  const t = useTraceWords();
  const names = useNames();
  const watch = feed.breakerType ? t(`breakerType.watch${feed.breakerType}`) : '';
  const note = t(`feed.${feed.kind}.note`) || watch;
  return (
    <div>
      <Ask>
        {t(`feed.${feed.kind}.powerOn`, { circuit: names.circuit(circuit) })}{' '}
        {t(`feed.${feed.kind}.ask`)}
      </Ask>
      {note && <Note>{note}</Note>}
    </div>
  );
}
