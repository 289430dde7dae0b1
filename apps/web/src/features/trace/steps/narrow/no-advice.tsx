import { ErrorState } from '../../../../ui';
import { Panel, PanelBody, Text } from '../../controls/panel';
import type { Unanswered } from '../../store/use-advice';
import { useTraceWords } from '../../words/use-trace-words';
import { Later } from './later';

/** While the planner works out the next power-up, and where it cannot. What is known so far stays on the drawing. */
export function NoAdvice({ failure }: { failure: Unanswered | null }) {
  const t = useTraceWords();
  return (
    <Panel>
      <PanelBody>
        {failure ? (
          <ErrorState error={failure.error} onRetry={failure.retry} />
        ) : (
          <div role="status">
            <Later>
              <Text>{t('narrow.working')}</Text>
            </Later>
          </div>
        )}
      </PanelBody>
    </Panel>
  );
}
