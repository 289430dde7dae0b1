import type { PartId } from '@lampwright/harness';
import { isUnchanged, situation } from '@lampwright/trace';
import { useCallback, useMemo, useState } from 'react';
import { Callout } from '../../../../ui';
import { ChoiceCard } from '../../controls/choice-card';
import { FieldButton, GoBackButton, GoOnButton } from '../../controls/field-button';
import { Ask, Panel, PanelAnswers, PanelBody, Row, Small, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useOwnFigures } from '../../store/use-advice';
import type { NextPowerUp } from '../../store/use-next-power-up';
import { durationWords } from '../../words/duration-words';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { OwnReason } from './own-reason';
import { usePoints } from './use-points';

interface PickScreenProps {
  next: NextPowerUp;
  /** The point that was touched on the drawing to come here. */
  touched: PartId | null;
  back: () => void;
}

/** The person picks the points to open, here or on the drawing, and sees what the choice is worth. */
export function PickScreen({ next, touched, back }: PickScreenProps) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const { parts, pickable, barred } = usePoints();
  const context = useTraceContext((whole) => whole);
  const question = useTraceContext((whole) => situation(whole)?.question ?? null);
  const [picked, setPicked] = useState<readonly PartId[]>(() =>
    touched === null ? next.open.filter((point) => pickable.has(point)) : [touched],
  );
  // What is picked on coming here stands first, where it is seen; the order then stays.
  const [first] = useState(picked);
  const ordered = [...parts].sort(
    (a, b) => Number(first.includes(b.id)) - Number(first.includes(a.id)),
  );
  const toggle = useCallback(
    (point: PartId) =>
      setPicked((points) =>
        points.includes(point) ? points.filter((other) => other !== point) : [...points, point],
      ),
    [],
  );
  // What is open on other circuits stays as it is.
  const open = useMemo(
    () => [...context.open.filter((point) => !pickable.has(point)), ...picked],
    [context.open, pickable, picked],
  );
  const unchanged = context.circuit !== null && isUnchanged(context, context.circuit, open);
  const own = useOwnFigures(question, unchanged ? null : open);
  useShowOnDrawing(
    useMemo(() => ({ cut: picked, pickable, onPick: toggle }), [picked, pickable, toggle]),
  );
  const use = async () => {
    if (await record({ type: 'powerUp.chosen', open })) back();
  };
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="pick">{t('narrow.pickTitle')}</StepHeading>
        <Small>{t('narrow.pickHelp')}</Small>
        <Stack>
          {ordered.map((part) => (
            <ChoiceCard
              key={part.id}
              label={part.label}
              about={[
                part.where,
                part.separable &&
                  t('narrow.pickOpens', { seconds: durationWords(part.separable.openSeconds, t) }),
              ]
                .filter(Boolean)
                .join(' · ')}
              chosen={picked.includes(part.id)}
              onTap={() => toggle(part.id)}
            />
          ))}
        </Stack>
        {barred.length > 0 && <Ask>{t('narrow.pickBarred')}</Ask>}
        {barred.map(({ part, reason }) => (
          <FieldButton
            key={part.id}
            onTap={() => void record({ type: 'point.allowed', point: part.id })}
          >
            {t('narrow.pickAllow', { point: part.label })} ({t(`narrow.bar.${reason}`)})
          </FieldButton>
        ))}
      </PanelBody>
      <PanelAnswers>
        <div role="status" aria-busy={!unchanged && !own.followed && !own.value}>
          {unchanged ? (
            <Callout tone="caution">{t('narrow.pickSame')}</Callout>
          ) : (
            <OwnReason
              points={picked.length === 0 ? t('narrow.pickNone') : names.parts(picked)}
              own={own}
              advised={next.advised}
            />
          )}
        </div>
        <Row>
          <GoBackButton onTap={back}>{t('narrow.cancel')}</GoBackButton>
          <GoOnButton disabled={unchanged} onTap={() => void use()}>
            {t('narrow.pickUse')}
          </GoOnButton>
        </Row>
      </PanelAnswers>
    </Panel>
  );
}
