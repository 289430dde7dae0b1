import { useParams } from 'react-router-dom';
import { ErrorState, Loading, Page } from '../../ui';
import { TapGuardProvider } from './controls/tap-guard';
import { ReplayScreen } from './replay/replay-screen';
import { useTrace } from './store/use-trace';
import { TraceScreen } from './trace-screen';

/** One trace: the work of the moment for who runs it, the record for who reads it. */
export function TracePage() {
  const { id = '' } = useParams();
  const { trace, retry } = useTrace(id);
  switch (trace.state) {
    case 'loading':
      return (
        <Page width="reading">
          <Loading />
        </Page>
      );
    case 'failed':
      return (
        <Page width="reading">
          <ErrorState error={trace.error} onRetry={retry} />
        </Page>
      );
    case 'reading':
      return (
        <TapGuardProvider>
          <ReplayScreen record={trace.record} />
        </TapGuardProvider>
      );
    case 'writing':
      return (
        <TapGuardProvider>
          <TraceScreen store={trace.store} />
        </TapGuardProvider>
      );
  }
}
