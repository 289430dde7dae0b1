import type { PartId } from '@lampwright/harness';
import type { BarReason } from '@lampwright/trace';
import { useMemo, useState } from 'react';
import { AnswerButton } from '../../controls/answer-button';
import { ChoiceCard } from '../../controls/choice-card';
import { FieldButton } from '../../controls/field-button';
import { Ask, Panel, PanelAnswers, PanelBody, Small, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';

const reasons: readonly BarReason[] = ['cantReach', 'hardWired', 'missing'];

interface BarScreenProps {
  /** The points that it may be about. */
  points: readonly PartId[];
  /** Asked because the plan is wrong: says what can be said of a plan while tracing. */
  plan?: boolean;
  back: () => void;
}

/** A point that cannot be opened after all, and why. */
export function BarScreen({ points, plan = false, back }: BarScreenProps) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const [point, setPoint] = useState(points.length === 1 ? points[0] : undefined);
  useShowOnDrawing(useMemo(() => (plan ? {} : { cut: points }), [plan, points]));
  const bar = async (reason: BarReason) => {
    if (point === undefined) return;
    await record({ type: 'point.barred', point, reason });
    back();
  };
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen={`bar-${point}`}>
          {point === undefined
            ? t(plan ? 'narrow.planTitle' : 'narrow.whichPoint')
            : t('narrow.barTitle', { point: names.part(point) })}
        </StepHeading>
        <Small>{t(plan ? 'narrow.planHelp' : 'narrow.barHelp')}</Small>
        {points.length > 1 && (
          <Stack>
            {points.map((each) => (
              <ChoiceCard
                single
                key={each}
                label={names.part(each)}
                about={names.where(each)}
                chosen={each === point}
                onTap={() => setPoint(each)}
              />
            ))}
          </Stack>
        )}
      </PanelBody>
      <PanelAnswers>
        {point !== undefined && (
          <>
            <Ask>{names.part(point)}</Ask>
            {reasons.map((reason) => (
              <AnswerButton
                key={reason}
                tone="plain"
                label={t(`narrow.bar.${reason}`)}
                about={t(`narrow.barAbout.${reason}`)}
                onTap={() => void bar(reason)}
              />
            ))}
          </>
        )}
        <FieldButton wide onTap={back}>
          {t('narrow.cancel')}
        </FieldButton>
      </PanelAnswers>
    </Panel>
  );
}
