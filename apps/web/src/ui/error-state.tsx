import { RotateCw } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useErrorWords } from '../lib/use-error-words';
import { Button } from './button';
import { Callout } from './callout';

/** What went wrong, in words, with a way to try again. */
export function ErrorState({ error, onRetry }: { error: unknown; onRetry?: () => void }) {
  const { t } = useTranslation();
  const words = useErrorWords();
  return (
    <Callout tone="caution" role="alert" title={t('wentWrong')}>
      <p>{words(error)}</p>
      {onRetry && (
        <Button icon={RotateCw} onClick={onRetry} mt="3">
          {t('tryAgain')}
        </Button>
      )}
    </Callout>
  );
}
