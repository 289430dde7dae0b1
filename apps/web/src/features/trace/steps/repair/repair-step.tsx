import { TextArea } from '../../../../ui';
import { GoOnButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Where } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useTraceDraft } from '../../store/use-trace-draft';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { ChoiceOrWords } from './choice-or-words';
import { causes, corrections } from './choices';
import { PartsUsed } from './parts-used';
import { emptyRepair, readRepairDraft, type RepairDraft } from './repair-draft';

/** Cause, correction and parts, by touches; words where no touch fits. */
export function RepairStep() {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const place = useTraceContext((context) => context.found);
  const hunt = useTraceContext((context) => context.hunt);
  const { value, ready, set, clear } = useTraceDraft(
    `repair:${hunt}`,
    emptyRepair,
    readRepairDraft,
  );
  if (!place || !ready) return null;
  const change = (part: Partial<RepairDraft>) => set({ ...value, ...part });
  const causeId = causes.find((id) => id === value.cause);
  const correctionId = corrections.find((id) => id === value.correction);
  const cause = causeId ? t(`repair.causes.${causeId}`) : value.causeWords.trim();
  const correction = correctionId
    ? t(`repair.corrections.${correctionId}`)
    : value.correctionWords.trim();
  const note = value.note.trim();
  const done = async () => {
    const recorded = await record({
      type: 'repair.made',
      place,
      cause,
      correction,
      parts: value.parts,
      ...(note && { note }),
    });
    if (recorded) clear();
  };
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="repair">{t('repair.title')}</StepHeading>
        <Where>{t('repair.at', { place: names.place(place) })}</Where>
        <ChoiceOrWords
          title={t('repair.cause')}
          choices={causes}
          labelOf={(id) => t(`repair.causes.${id}`)}
          chosen={value.cause}
          words={value.causeWords}
          onChoose={(id) => change({ cause: id })}
          onWords={(causeWords) => change({ causeWords })}
        />
        <ChoiceOrWords
          title={t('repair.correction')}
          choices={corrections}
          labelOf={(id) => t(`repair.corrections.${id}`)}
          chosen={value.correction}
          words={value.correctionWords}
          onChoose={(id) => change({ correction: id })}
          onWords={(correctionWords) => change({ correctionWords })}
        />
        <PartsUsed parts={value.parts} onChange={(parts) => change({ parts })} />
        <TextArea
          size="field"
          label={t('repair.note')}
          value={value.note}
          onChange={(event) => change({ note: event.target.value })}
        />
      </PanelBody>
      <PanelAnswers>
        <GoOnButton wide disabled={!cause || !correction} onTap={() => void done()}>
          {t('repair.done')}
        </GoOnButton>
      </PanelAnswers>
    </Panel>
  );
}
