import type { PlanDto } from '@lampwright/contracts';
import { Download, FileUp } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import { usePlan } from '../../lib/api/plans';
import { formatDate } from '../../lib/format';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import {
  Button,
  ErrorState,
  LinkButton,
  Loading,
  Page,
  PageHeader,
  Panel,
  SectionTitle,
} from '../../ui';
import { PlanPicture } from '../../ui/plan-picture';
import { CircuitTable } from './circuit-table';
import { downloadPlan } from './download-plan';
import { ForecastTable } from './forecast/forecast-table';
import { PartTable } from './part-table';
import { RunTable } from './run-table';

function Actions({ plan }: { plan: PlanDto }) {
  const { t } = useTranslation('plans');
  return (
    <>
      <Button icon={Download} onClick={() => downloadPlan(plan)}>
        {t('export')}
      </Button>
      {useMay('plans.publish') && (
        <LinkButton to={paths.importPlan(plan.id)} icon={FileUp}>
          {t('importRevision')}
        </LinkButton>
      )}
    </>
  );
}

/** A plan to read: the drawing, then what it is made of. */
export function PlanPage() {
  const { t } = useTranslation('plans');
  const { id = '' } = useParams();
  const { data: plan, error, mutate } = usePlan(id);
  const back = { to: paths.plans(), label: t('back') };
  if (!plan) {
    return (
      <Page>
        <PageHeader title={t('title')} back={back} />
        {error ? <ErrorState error={error} onRetry={() => void mutate()} /> : <Loading rows={6} />}
      </Page>
    );
  }
  const { harness, revision, updatedAt } = plan;
  return (
    <Page>
      <PageHeader
        title={plan.name}
        lead={`${t('planLead', { revision, when: formatDate(updatedAt) })}. ${t('supplyWords', { ...harness.supply })}.`}
        back={back}
        actions={<Actions plan={plan} />}
      />
      <Panel>
        <SectionTitle>{t('drawing')}</SectionTitle>
        <PlanPicture harness={harness} />
      </Panel>
      <CircuitTable harness={harness} />
      <ForecastTable harness={harness} />
      <PartTable harness={harness} />
      <RunTable harness={harness} />
    </Page>
  );
}
