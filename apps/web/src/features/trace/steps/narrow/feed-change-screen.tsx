import {
  cautionsFor,
  cautionsLeft,
  type CautionId,
  type Feed,
  type FeedKind,
  type TraceContext,
} from '@lampwright/trace';
import { useState } from 'react';
import { GoBackButton, GoOnButton } from '../../controls/field-button';
import { Ask, Panel, PanelAnswers, PanelBody, Row } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useTraceWords } from '../../words/use-trace-words';
import { CautionTicks } from '../caution-ticks';
import { FeedChoice, feedOf, type FeedDraft } from '../feed-choice';

interface FeedChangeScreenProps {
  offered?: readonly FeedKind[];
  back: () => void;
}

/** Another feed for the rest of the trace. */
export function FeedChangeScreen({ offered, back }: FeedChangeScreenProps) {
  const t = useTraceWords();
  const record = useRecord();
  const context = useTraceContext((whole) => whole);
  const { feed } = context;
  const [draft, setDraft] = useState<FeedDraft>({
    feedKind: null,
    breakerType: null,
    atHand: feed?.atHand ?? null,
  });
  // What was unticked on arrival stays in the list once it is ticked, so that a tick can be seen.
  const [ticked] = useState(context.cautions);
  const next = feedOf(draft);
  const asked = next ? cautionsNew(context, next, ticked) : [];
  const left = cautionsLeft(context, asked).length;
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
        {asked.length > 0 && (
          <>
            <Ask>{t('feedChange.cautions')}</Ask>
            <CautionTicks cautions={asked} />
          </>
        )}
      </PanelBody>
      <PanelAnswers>
        <Row>
          <GoBackButton onTap={back}>{t('narrow.cancel')}</GoBackButton>
          <GoOnButton disabled={!next || left > 0} onTap={() => void use()}>
            {left > 0 ? t('makeSafe.left', { count: left }) : t('feedChange.use')}
          </GoOnButton>
        </Row>
      </PanelAnswers>
    </Panel>
  );
}

/** The cautions that another feed asks for beyond those that were `ticked` before. */
function cautionsNew(context: TraceContext, feed: Feed, ticked: readonly CautionId[]): CautionId[] {
  return cautionsFor({ ...context, feed }).filter((caution) => !ticked.includes(caution));
}
