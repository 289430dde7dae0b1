import type { Advice } from '@lampwright/isolation';
import { ErrorState } from '../../../../ui';
import { Text } from '../../controls/panel';
import type { OwnFigures } from '../../store/adviser';
import type { Answer } from '../../store/use-advice';
import { useTraceWords } from '../../words/use-trace-words';
import { Later } from './later';
import { ownReason, splitWords } from './use-reason';

interface OwnReasonProps {
  points: string;
  own: Answer<OwnFigures> & { followed: boolean };
  advised: Advice;
}

/** The points that are picked and what they are worth. */
export function OwnReason({ points, own, advised }: OwnReasonProps) {
  const t = useTraceWords();
  if (own.failure) return <ErrorState error={own.failure.error} onRetry={own.failure.retry} />;
  return (
    <Text>
      {points}.{' '}
      {own.followed ? (
        splitWords(advised, t)
      ) : own.value ? (
        ownReason(own.value, t)
      ) : (
        <Later>{t('narrow.weighing')}</Later>
      )}
    </Text>
  );
}
