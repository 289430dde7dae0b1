import { useSyncExternalStore } from 'react';
import { Callout, LinkButton } from '../../../ui';
import { paths } from '../../../lib/paths';
import { GoOnButton } from '../controls/field-button';
import { Panel, PanelAnswers, PanelBody } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { useTraceContext, useTraceSession } from '../store/trace-session';
import type { TraceStore } from '../store/trace-store';
import { partsWords } from '../words/parts-words';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';
import { Facts } from './facts';
import { FindingsList } from './findings-list';

/** What was done, for whoever reads the trace next. */
export function SignedStep({ onReplay }: { onReplay: () => void }) {
  const t = useTraceWords();
  const names = useNames();
  const { store } = useTraceSession();
  const context = useTraceContext((whole) => whole);
  const { signature, record, repairs, powerUps } = context;
  if (!signature) return null;
  const found = names.list(repairs.map(({ place }) => names.place(place)));
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="signed">
          {t('signed.title', { unit: record.trailer.unit })}
        </StepHeading>
        {store && <SentNotice store={store} />}
        <Facts
          facts={[
            { key: 'found', name: t('signed.found'), value: found || t('signed.noFind') },
            { key: 'cause', name: t('signed.cause'), value: signature.cause },
            { key: 'correction', name: t('signed.correction'), value: signature.correction },
            { key: 'minutes', name: t('signed.minutes'), value: signature.minutes },
            { key: 'powerUps', name: t('signed.powerUps'), value: powerUps.length },
            {
              key: 'parts',
              name: t('signed.parts'),
              value: partsWords(signature.parts, t) || t('sign.noParts'),
            },
            {
              key: 'by',
              name: t('signed.signed'),
              value: t('signed.by', {
                name: signature.name,
                when: new Date(signature.at).toLocaleString(),
              }),
            },
          ]}
        />
        <FindingsList />
        <Callout>{t('intake.rule')}</Callout>
      </PanelBody>
      <PanelAnswers>
        <GoOnButton wide onTap={onReplay}>
          {t('signed.replay')}
        </GoOnButton>
        <LinkButton to={paths.yard()} wide>
          {t('common:toTheYard')}
        </LinkButton>
      </PanelAnswers>
    </Panel>
  );
}

function SentNotice({ store }: { store: TraceStore }) {
  const t = useTraceWords();
  const { waiting } = useSyncExternalStore(store.subscribe, store.getSync);
  return waiting > 0 ? (
    <Callout tone="next" role="status">
      {t('signed.waiting')}
    </Callout>
  ) : (
    <Callout tone="done" role="status">
      {t('signed.sent')}
    </Callout>
  );
}
