import { placeKey, type PartId, type PlaceRef } from '@lampwright/harness';
import { situation } from '@lampwright/trace';
import { useCallback, useMemo } from 'react';
import { useAnnounce } from '../../controls/announcer';
import { AnswerButton } from '../../controls/answer-button';
import { GoBackButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Small, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';

/** Damage that was seen makes a place likelier. A part can be touched on the drawing, a wire is picked from the list. */
export function DamageScreen({ back }: { back: () => void }) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const announce = useAnnounce();
  const places = useTraceContext((context) => situation(context)?.placesInQuestion ?? null);
  const note = useCallback(
    async (place: PlaceRef) => {
      if (await record({ type: 'damage.seen', place })) {
        announce(t('narrow.damageDone', { place: names.place(place) }));
      }
      back();
    },
    [record, announce, names, t, back],
  );
  useShowOnDrawing(
    useMemo(() => ({ onPick: (id: PartId) => void note({ kind: 'part', id }) }), [note]),
  );
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="damage">{t('narrow.damageTitle')}</StepHeading>
        <Small>{t('narrow.damageHelp')}</Small>
        <Stack>
          {places?.map(({ ref }) => (
            <AnswerButton
              key={placeKey(ref)}
              tone="plain"
              label={names.place(ref)}
              onTap={() => void note(ref)}
            />
          ))}
        </Stack>
      </PanelBody>
      <PanelAnswers>
        <GoBackButton wide onTap={back}>
          {t('narrow.cancel')}
        </GoBackButton>
      </PanelAnswers>
    </Panel>
  );
}
