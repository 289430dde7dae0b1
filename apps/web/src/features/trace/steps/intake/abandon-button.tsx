import { useState } from 'react';
import { ConfirmDialog } from '../../../../ui';
import { FieldButton } from '../../controls/field-button';
import { useRecord } from '../../store/trace-session';
import { useTraceWords } from '../../words/use-trace-words';

/** Ends a trace that was begun by mistake. It cannot be taken back, so it asks. */
export function AbandonButton() {
  const t = useTraceWords();
  const record = useRecord();
  const [asking, setAsking] = useState(false);
  const abandon = () => {
    setAsking(false);
    void record({ type: 'trace.abandoned', reason: t('intake.abandonReason') });
  };
  return (
    <>
      <FieldButton look="quiet" onTap={() => setAsking(true)}>
        {t('intake.abandon')}
      </FieldButton>
      <ConfirmDialog
        open={asking}
        title={t('intake.abandonAsk')}
        confirm={t('intake.abandonYes')}
        danger
        onConfirm={abandon}
        onClose={() => setAsking(false)}
      />
    </>
  );
}
