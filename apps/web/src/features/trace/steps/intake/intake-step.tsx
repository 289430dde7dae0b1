import { useState } from 'react';
import { Callout } from '../../../../ui';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useTraceDraft } from '../../store/use-trace-draft';
import { useTraceWords } from '../../words/use-trace-words';
import { Panel, PanelBody } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { feedOf } from '../feed-choice';
import { AbandonButton } from './abandon-button';
import { CircuitsScreen } from './circuits-screen';
import { isComplaint } from './complaints';
import { ComplaintScreen } from './complaint-screen';
import { FeedScreen } from './feed-screen';
import { emptyIntake, readIntakeDraft, type IntakeDraft } from './intake-draft';

const screens = ['complaint', 'circuits', 'feed'] as const;

/** Complaint, circuits and feed, one screen each; recorded together at the end. */
export function IntakeStep() {
  const t = useTraceWords();
  const record = useRecord();
  const tank = useTraceContext((context) => context.record.trailer.bodyType === 'tank');
  const { value, ready, set, clear } = useTraceDraft('intake', emptyIntake, readIntakeDraft);
  const [at, setAt] = useState(0);
  const feed = feedOf(value);
  const change = (part: Partial<IntakeDraft>) => set({ ...value, ...part });
  if (tank) return <TankScreen />;
  if (!ready) return null;

  const state = async () => {
    if (!feed) return;
    const chosen = isComplaint(value.complaint) && t(`intake.choices.${value.complaint}`);
    const complaint = [chosen, value.words.trim()];
    const recorded = await record({
      type: 'intake.stated',
      complaint: complaint.filter(Boolean).join('. '),
      circuits: value.circuits,
      feed,
    });
    if (recorded) clear();
  };
  const back = () => setAt(at - 1);
  const next = () => setAt(at + 1);
  switch (screens[at]) {
    case 'circuits':
      return <CircuitsScreen draft={value} change={change} back={back} next={next} />;
    case 'feed':
      return (
        <FeedScreen
          draft={value}
          change={change}
          complete={feed !== null}
          back={back}
          next={() => void state()}
        />
      );
    default:
      return <ComplaintScreen draft={value} change={change} next={next} />;
  }
}

/** No way on: a tank trailer is not powered with this program's help. */
function TankScreen() {
  const t = useTraceWords();
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="tank">{t('common:step.intake')}</StepHeading>
        <Callout tone="caution" role="alert">
          {t('intake.tank')}
        </Callout>
        <AbandonButton />
      </PanelBody>
    </Panel>
  );
}
