import { Callout, TextArea, TextInput } from '../../../../ui';
import { useAccount } from '../../../../lib/session-context';
import { GoOnButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Small } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { Stepper } from '../../controls/stepper';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useTraceDraft } from '../../store/use-trace-draft';
import { partsWords } from '../../words/parts-words';
import { useTraceWords } from '../../words/use-trace-words';
import { Facts } from '../facts';
import { FindingsList } from '../findings-list';
import { readSignDraft, untouched, type SignDraft } from './sign-draft';
import { useSignable } from './use-signable';

/** Name, cause, correction and minutes, filled in from the record and open to change. */
export function SignStep() {
  const t = useTraceWords();
  const record = useRecord();
  const account = useAccount();
  const signable = useSignable();
  const { value, ready, set, clear } = useTraceDraft('sign', untouched, readSignDraft);
  const powerUps = useTraceContext((context) => context.powerUps.length);
  if (!ready) return null;
  const change = (part: Partial<SignDraft>) => set({ ...value, ...part });
  const name = value.name ?? account.name;
  const cause = value.cause ?? signable.cause;
  const correction = value.correction ?? signable.correction;
  const minutes = value.minutes ?? signable.minutes;
  const { parts } = signable;
  const sign = async () => {
    const signed = await record({
      type: 'trace.signed',
      name: name.trim(),
      cause: cause.trim(),
      correction: correction.trim(),
      minutes,
      parts,
    });
    if (signed) clear();
  };
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="sign">{t('sign.title')}</StepHeading>
        <Callout>{t('intake.rule')}</Callout>
        <TextArea
          size="field"
          label={t('sign.cause')}
          value={cause}
          onChange={(event) => change({ cause: event.target.value })}
        />
        <TextArea
          size="field"
          label={t('sign.correction')}
          value={correction}
          onChange={(event) => change({ correction: event.target.value })}
        />
        <Stepper
          label={t('sign.minutes')}
          value={minutes}
          step={minutes >= 20 ? 5 : 1}
          moreLabel={t('sign.minutesMore')}
          fewerLabel={t('sign.minutesLess')}
          onChange={(changed) => change({ minutes: changed })}
        />
        <Small>{t('sign.minutesComputed', { minutes: signable.minutes })}</Small>
        <Facts
          facts={[
            {
              key: 'parts',
              name: t('sign.parts'),
              value: parts.length > 0 ? partsWords(parts, t) : t('sign.noParts'),
            },
            { key: 'powerUps', name: t('signed.powerUps'), value: powerUps },
          ]}
        />
        <FindingsList />
        <TextInput
          size="field"
          label={t('sign.name')}
          autoComplete="name"
          value={name}
          onChange={(event) => change({ name: event.target.value })}
        />
      </PanelBody>
      <PanelAnswers>
        <Small>{t('sign.cantUndo')}</Small>
        <GoOnButton wide disabled={!name.trim() || !cause.trim()} onTap={() => void sign()}>
          {t('sign.done')}
        </GoOnButton>
      </PanelAnswers>
    </Panel>
  );
}
