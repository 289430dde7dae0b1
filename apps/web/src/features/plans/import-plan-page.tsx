import type { Harness } from '@lampwright/harness';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { ApiError } from '../../lib/api-error';
import { createPlan, revisePlan, usePlan } from '../../lib/api/plans';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { useRevalidate } from '../../lib/use-revalidate';
import { Button, Callout, ErrorState, Page, PageHeader, Panel, toast } from '../../ui';
import { PlanPicture } from '../../ui/plan-picture';
import { FaultsFound } from './faults-found';
import { PlanFile, type FileReading } from './plan-file';
import { serverFaults } from './server-faults';

function Store({ harness, planId }: { harness: Harness; planId: string | null }) {
  const { t } = useTranslation('plans');
  const navigate = useNavigate();
  const revalidate = useRevalidate();
  const { run, busy, error } = useAction((plan: Harness) =>
    planId ? revisePlan(planId, { harness: plan }) : createPlan({ harness: plan }),
  );
  const store = async () => {
    const outcome = await run(harness);
    if (!outcome?.ok) return;
    const { id, name, revision } = outcome.value;
    toast(t('stored', { name, revision }));
    void revalidate('plans', 'trailers');
    await navigate(paths.plan(id));
  };
  return (
    <Panel>
      <Callout tone="done" role="status" title={t('holds')}>
        {t('holdsWords', {
          name: harness.name,
          circuits: harness.circuits.length,
          parts: harness.parts.length,
          runs: harness.runs.length,
        })}
      </Callout>
      <PlanPicture harness={harness} />
      {error !== null && <ErrorState error={error} />}
      {error instanceof ApiError && error.reason === 'planFaults' && (
        <FaultsFound faults={serverFaults(error)} more={false} />
      )}
      <div>
        <Button look="primary" busy={busy} onClick={() => void store()}>
          {t(planId ? 'storeRevision' : 'store')}
        </Button>
      </div>
    </Panel>
  );
}

/** A lead picks a file, sees every fault or the drawing, and only then stores it. */
export function ImportPlanPage() {
  const { t } = useTranslation('plans');
  const [params] = useSearchParams();
  const planId = params.get('plan');
  const { data: plan } = usePlan(planId);
  const [reading, setReading] = useState<FileReading | null>(null);
  const allowed = useMay('plans.publish');
  return (
    <Page>
      <PageHeader
        title={plan ? t('importRevisionTitle', { name: plan.name }) : t('importTitle')}
        lead={t('importLead')}
        back={{ to: planId ? paths.plan(planId) : paths.plans(), label: plan?.name ?? t('back') }}
      />
      {!allowed ? (
        <Callout>{t('notAllowed')}</Callout>
      ) : (
        <>
          <PlanFile onRead={setReading} />
          {reading?.kind === 'unreadable' && (
            <Callout tone="caution" role="alert">
              {t('unreadable')}
            </Callout>
          )}
          {reading?.kind === 'faults' && (
            <FaultsFound faults={reading.faults} more={reading.more} />
          )}
          {reading?.kind === 'plan' && (
            <Store key={reading.name} harness={reading.harness} planId={planId} />
          )}
        </>
      )}
    </Page>
  );
}
