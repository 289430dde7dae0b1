import { useState, useSyncExternalStore, useMemo } from 'react';
import { Announcer } from './controls/announcer';
import { DrawingPane } from './layout/drawing-pane';
import { HeaderStrip } from './layout/header-strip';
import { HistoryStrip } from './layout/history-strip';
import { OverlayProvider } from './layout/overlay';
import { SentState } from './layout/sent-state';
import { TraceLayout } from './layout/trace-layout';
import { Trouble } from './layout/trouble';
import { ReplayScreen } from './replay/replay-screen';
import { StepPanel } from './steps/step-panel';
import { AdviserProvider } from './store/adviser-context';
import { TraceSessionProvider } from './store/trace-session';
import type { TraceStore } from './store/trace-store';

/** A trace that this person works on. */
export function TraceScreen({ store }: { store: TraceStore }) {
  return (
    <AdviserProvider>
      <Screens store={store} />
    </AdviserProvider>
  );
}

function Screens({ store }: { store: TraceStore }) {
  const actor = useSyncExternalStore(store.subscribe, store.getActor);
  const session = useMemo(() => ({ store, actor }), [store, actor]);
  const [replaying, setReplaying] = useState(false);
  if (replaying) {
    const { record } = actor.getSnapshot().context.log;
    return <ReplayScreen record={record} onClose={() => setReplaying(false)} />;
  }
  return (
    <Announcer>
      <TraceSessionProvider value={session}>
        <OverlayProvider>
          <TraceLayout
            head={
              <HeaderStrip>
                <SentState store={store} />
              </HeaderStrip>
            }
            plan={<DrawingPane />}
            past={<HistoryStrip />}
          >
            <Trouble store={store} />
            <StepPanel onReplay={() => setReplaying(true)} />
          </TraceLayout>
        </OverlayProvider>
      </TraceSessionProvider>
    </Announcer>
  );
}
