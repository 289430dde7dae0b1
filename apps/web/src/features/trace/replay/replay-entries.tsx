import { chakra } from '@chakra-ui/react';
import type { TraceEvent } from '@lampwright/trace';
import { useEffect, useRef } from 'react';
import { FieldButton } from '../controls/field-button';
import { useTraceWords } from '../words/use-trace-words';

const Entries = chakra('ol', {
  base: { display: 'flex', flexDirection: 'column', gap: 'touch', listStyle: 'none' },
});

interface ReplayEntriesProps {
  events: readonly TraceEvent[];
  /** How many entries are shown on the drawing. */
  at: number;
  words: (event: TraceEvent) => string;
  onMove: (at: number) => void;
}

/** All entries, the current one kept in sight. */
export function ReplayEntries({ events, at, words, onMove }: ReplayEntriesProps) {
  const t = useTraceWords();
  const list = useRef<HTMLOListElement>(null);
  useEffect(() => {
    const entry = list.current?.children[at - 1];
    const body = list.current?.parentElement;
    if (!entry || !body) return;
    // Only within the panel: on a phone, where the page scrolls, the entry is told in full at the top.
    const { top } = entry.getBoundingClientRect();
    body.scrollTo?.({ top: body.scrollTop + top - body.getBoundingClientRect().top - 12 });
  }, [at]);
  return (
    <Entries ref={list} aria-label={t('replay.list')}>
      {events.map((event, index) => (
        <li key={event.id}>
          <FieldButton
            wide
            justifyContent="flex-start"
            textAlign="start"
            fontWeight="normal"
            pressed={index === at - 1}
            onTap={() => onMove(index + 1)}
          >
            {index + 1}. {words(event)}
          </FieldButton>
        </li>
      ))}
    </Entries>
  );
}
