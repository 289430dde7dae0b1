import type { TrailerDto } from '@lampwright/contracts';
import { useTranslation } from 'react-i18next';
import { PlanPicture } from '../../ui/plan-picture';
import { usePlan } from '../../lib/api/plans';
import { paths } from '../../lib/paths';
import { EmptyState, ErrorState, LinkButton, Loading, Panel, SectionTitle } from '../../ui';

/** How the trailer is wired, a circuit at a time. */
export function TrailerPlan({ trailer }: { trailer: TrailerDto }) {
  const { t } = useTranslation('trailers');
  const { data, error, mutate } = usePlan(trailer.plan?.id ?? null);
  if (!trailer.plan) {
    return <EmptyState title={t('noPlanTitle')}>{t('noPlanWords')}</EmptyState>;
  }
  return (
    <Panel>
      <SectionTitle>{t('planTitle')}</SectionTitle>
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={4} />
      ) : (
        <PlanPicture harness={data.harness} trailer={trailer} />
      )}
      <div>
        <LinkButton to={paths.plan(trailer.plan.id)}>{t('openPlan')}</LinkButton>
      </div>
    </Panel>
  );
}
