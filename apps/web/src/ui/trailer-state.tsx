import type { TrailerDto } from '@lampwright/contracts';
import { useTranslation } from 'react-i18next';
import { StatusPill } from './status-pill';

/** What stands out about a trailer, in a word; nothing where nothing does. */
export function TrailerState({ trailer }: { trailer: TrailerDto }) {
  const { t } = useTranslation();
  if (trailer.bodyType === 'tank')
    return <StatusPill tone="danger">{t('trailerState.tank')}</StatusPill>;
  if (trailer.openTraceId) return <StatusPill tone="next">{t('trailerState.open')}</StatusPill>;
  if (!trailer.plan) return <StatusPill>{t('trailerState.noPlan')}</StatusPill>;
  return null;
}
