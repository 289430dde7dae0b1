import { openTrace, stepOf, type TraceRecord } from '@lampwright/trace';
import { useEffect, useMemo, useState } from 'react';
import { Announcer } from '../controls/announcer';
import { DrawingPane } from '../layout/drawing-pane';
import { HeaderStrip } from '../layout/header-strip';
import { HistoryStrip } from '../layout/history-strip';
import { OverlayProvider } from '../layout/overlay';
import { TraceLayout } from '../layout/trace-layout';
import { createTraceActor } from '../store/create-trace-actor';
import { TraceSessionProvider } from '../store/trace-session';
import { ReplayPanel } from './replay-panel';

interface ReplayScreenProps {
  record: TraceRecord;
  /** Back to the screens of the trace, for who may write. */
  onClose?: () => void;
}

/** The record, entry by entry, with the state after each on the drawing. Nothing can be changed here. */
export function ReplayScreen({ record, onClose }: ReplayScreenProps) {
  const [at, setAt] = useState(record.events.length);
  const shown = useMemo(() => ({ ...record, events: record.events.slice(0, at) }), [record, at]);
  const session = useMemo(() => ({ store: null, actor: createTraceActor(shown) }), [shown]);
  useEffect(() => () => session.actor.stop(), [session]);
  const step = useMemo(() => stepOf(openTrace(shown)), [shown]);
  return (
    <Announcer>
      <TraceSessionProvider value={session}>
        <OverlayProvider>
          <TraceLayout head={<HeaderStrip />} plan={<DrawingPane />} past={<HistoryStrip />}>
            <ReplayPanel
              record={record}
              at={at}
              step={step}
              onMove={setAt}
              {...(onClose ? { onClose } : {})}
            />
          </TraceLayout>
        </OverlayProvider>
      </TraceSessionProvider>
    </Announcer>
  );
}
