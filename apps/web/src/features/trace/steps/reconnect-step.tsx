import { reconnectList } from '@lampwright/trace';
import { Callout } from '../../../ui';
import { Eyebrow, Panel, PanelBody } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { useTraceContext } from '../store/trace-session';
import { useTraceWords } from '../words/use-trace-words';
import { ClosePoints } from './close-points';

/** Everything that this trace left open. There is no way on but through the list. */
export function ReconnectStep() {
  const t = useTraceWords();
  const context = useTraceContext((whole) => whole);
  const points = reconnectList(context).map(({ id }) => id);
  const off = context.feed && t(`feed.${context.feed.kind}.off`);
  return (
    <Panel>
      <PanelBody>
        <Eyebrow>{t('reconnect.left', { count: points.length })}</Eyebrow>
        <StepHeading screen="reconnect">{t('reconnect.title')}</StepHeading>
        <Callout tone="caution" title={off}>
          {t('reconnect.help')}
        </Callout>
        <ClosePoints points={points} />
      </PanelBody>
    </Panel>
  );
}
