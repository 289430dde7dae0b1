import { canUndo } from '@lampwright/trace';
import { useAnnounce } from '../controls/announcer';
import { useTraceWords } from '../words/use-trace-words';
import { useRecord, useTraceLog, useTraceSession } from './trace-session';

export interface Undo {
  /** What the button says to those who do not see it: what would be taken back. */
  name: string;
  run: () => void;
}

/** Takes back the newest thing that was said; `null` where there is nothing, or the trace is only read. */
export function useUndo(): Undo | null {
  const t = useTraceWords();
  const record = useRecord();
  const announce = useAnnounce();
  const { store } = useTraceSession();
  const newest = useTraceLog((log) => (canUndo(log) ? log.effective.at(-1) : undefined));
  if (!store || !newest) return null;
  const what = t(`event.${newest.type}`);
  return {
    name: `${t('page.undo')}: ${what}`,
    run: () => {
      void record({ type: 'event.undone', target: newest.id }).then((done) => {
        if (done) announce(t('page.undone', { what }));
      });
    },
  };
}
