import type { FeedKind } from '@lampwright/trace';
import { useState } from 'react';
import { GoBackButton, GoOnButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Row } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useTraceWords } from '../../words/use-trace-words';
import { FeedChoice, feedOf, type FeedDraft } from '../feed-choice';

interface FeedChangeScreenProps {
  offered?: readonly FeedKind[];
  back: () => void;
}

/** Another feed for the rest of the trace. */
export function FeedChangeScreen({ offered, back }: FeedChangeScreenProps) {
  const t = useTraceWords();
  const record = useRecord();
  const feed = useTraceContext((context) => context.feed);
  const [draft, setDraft] = useState<FeedDraft>({
    feedKind: null,
    breakerType: null,
    atHand: feed?.atHand ?? null,
  });
  const next = feedOf(draft);
  const use = async () => {
    if (next && (await record({ type: 'feed.changed', feed: next }))) back();
  };
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="feedChange">{t('feedChange.title')}</StepHeading>
        <FeedChoice
          draft={draft}
          change={(part) => setDraft({ ...draft, ...part })}
          {...(offered ? { offered } : {})}
        />
      </PanelBody>
      <PanelAnswers>
        <Row>
          <GoBackButton onTap={back}>{t('narrow.cancel')}</GoBackButton>
          <GoOnButton disabled={!next} onTap={() => void use()}>
            {t('feedChange.use')}
          </GoOnButton>
        </Row>
      </PanelAnswers>
    </Panel>
  );
}
