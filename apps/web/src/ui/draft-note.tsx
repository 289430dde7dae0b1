import { useTranslation } from 'react-i18next';
import type { FormDraft } from '../lib/use-form-draft';
import { Button } from './button';
import { Callout } from './callout';

/** Tells that a form opened with what was typed before, or that this device keeps nothing. */
export function DraftNote({ draft, onAfresh }: { draft: FormDraft; onAfresh: () => void }) {
  const { t } = useTranslation();
  if (!draft.safe) {
    return (
      <Callout tone="caution" role="status">
        {t('draftNotKept')}
      </Callout>
    );
  }
  if (!draft.restored) return null;
  return (
    <Callout role="status">
      {t('draftKept')}{' '}
      <Button size="office" onClick={onAfresh}>
        {t('startAfresh')}
      </Button>
    </Callout>
  );
}
