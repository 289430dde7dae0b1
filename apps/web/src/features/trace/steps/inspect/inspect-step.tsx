import { placeKey, type PlaceRef } from '@lampwright/harness';
import { samePlace, situation } from '@lampwright/trace';
import { Crosshair } from 'lucide-react';
import { useCallback, useMemo, useState } from 'react';
import { Callout } from '../../../../ui';
import { AnswerButton } from '../../controls/answer-button';
import { FieldButton, GoOnButton } from '../../controls/field-button';
import {
  Ask,
  Eyebrow,
  Panel,
  PanelAnswers,
  PanelBody,
  Row,
  Stack,
  Text,
  Where,
} from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { PlaceList } from './place-list';
import { placesToInspect } from './places-to-inspect';
import { useKindOf } from './use-kind-of';

const methods = ['look', 'swap', 'meter'] as const;

/** One place of the section after another, the likeliest first. */
export function InspectStep() {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const kindOf = useKindOf();
  const now = useTraceContext(situation);
  const inspected = useTraceContext((context) => context.inspected);
  const [method, setMethod] = useState<(typeof methods)[number]>('look');
  const [picked, setPicked] = useState<PlaceRef | null>(null);
  const places = useMemo(() => (now ? placesToInspect(now, inspected) : []), [now, inspected]);
  const left = places.filter(({ clear }) => !clear);
  const current = left.find(({ ref }) => picked && samePlace(ref, picked)) ?? left[0];
  const pick = useCallback((part: string) => setPicked({ kind: 'part', id: part }), []);
  useShowOnDrawing(useMemo(() => ({ onPick: pick }), [pick]));

  const say = (finding: 'clear' | 'found') => {
    if (!current) return;
    setPicked(null);
    void record({ type: 'place.inspected', place: current.ref, method, finding });
  };
  const resume = () => void record({ type: 'narrowing.resumed' });
  // While the readings point to one section, all of it is looked at first.
  const mayResume = (now?.known ?? null) === null || left.length === 0;

  if (!current) {
    return (
      <Panel>
        <PanelBody>
          <StepHeading screen="allClear">{t('inspect.allClear')}</StepHeading>
          <PlaceList places={places} current={null} onPick={setPicked} />
        </PanelBody>
        <PanelAnswers>
          <GoOnButton wide onTap={resume}>
            {t('inspect.resume')}
          </GoOnButton>
        </PanelAnswers>
      </Panel>
    );
  }
  const where = current.ref.kind === 'part' ? names.where(current.ref.id) : '';
  return (
    <Panel>
      <PanelBody>
        <Eyebrow>{t('inspect.eyebrow', { left: left.length, of: places.length })}</Eyebrow>
        <StepHeading screen={placeKey(current.ref)}>
          {t('inspect.title', { place: names.place(current.ref) })}
        </StepHeading>
        {where && <Where>{where}</Where>}
        <Callout tone="caution" title={t('inspect.powerOff')}>
          {t('caution.hotParts.text')}
        </Callout>
        <Text>{t(`inspect.lookFor.${kindOf(current.ref)}`)}</Text>
        <Ask>{t('inspect.listTitle')}</Ask>
        <PlaceList places={places} current={current.ref} onPick={setPicked} />
        {mayResume && <FieldButton onTap={resume}>{t('inspect.resume')}</FieldButton>}
      </PanelBody>
      <PanelAnswers>
        <Row role="group" aria-label={t('inspect.method')}>
          {methods.map((each) => (
            <FieldButton key={each} pressed={each === method} onTap={() => setMethod(each)}>
              {t(`inspect.${each}`)}
            </FieldButton>
          ))}
        </Row>
        <Stack>
          <AnswerButton
            tone="overload"
            icon={Crosshair}
            label={t('inspect.found')}
            onTap={() => say('found')}
          />
          <AnswerButton tone="holds" label={t('inspect.clear')} onTap={() => say('clear')} />
        </Stack>
      </PanelAnswers>
    </Panel>
  );
}
