import { chakra } from '@chakra-ui/react';
import type { TrailerDto } from '@lampwright/contracts';
import { ArrowRight, Pencil } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import { useTrailer } from '../../lib/api/trailers';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { Callout, ErrorState, LinkButton, Loading, Page, PageHeader } from '../../ui';
import { TrailerFacts } from './trailer-facts';
import { TrailerHistory } from './trailer-history';
import { TrailerPlan } from './trailer-plan';

const Columns = chakra('div', {
  base: {
    display: 'grid',
    gap: '6',
    gridTemplateColumns: { base: '1fr', lg: 'minmax(17rem, 22rem) minmax(0, 1fr)' },
    alignItems: 'start',
  },
});
const Column = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', gap: '6', minW: '0' },
});

function Actions({ trailer }: { trailer: TrailerDto }) {
  const { t } = useTranslation(['trailers', 'common']);
  const mayWrite = useMay('trailers.write');
  const mayRun = useMay('traces.run') && trailer.bodyType !== 'tank' && trailer.plan;
  return (
    <>
      {mayWrite && (
        <LinkButton to={paths.editTrailer(trailer.id)} icon={Pencil}>
          {t('edit')}
        </LinkButton>
      )}
      {trailer.openTraceId ? (
        <LinkButton to={paths.trace(trailer.openTraceId)} look="primary" icon={ArrowRight}>
          {t('carryOn')}
        </LinkButton>
      ) : (
        mayRun && (
          <LinkButton to={paths.newTrace(trailer.id)} look="primary" icon={ArrowRight}>
            {t('start')}
          </LinkButton>
        )
      )}
    </>
  );
}

export function TrailerPage() {
  const { t } = useTranslation(['trailers', 'common']);
  const { id = '' } = useParams();
  const { data: trailer, error, mutate } = useTrailer(id);
  const back = { to: paths.trailers(), label: t('back') };
  if (!trailer) {
    return (
      <Page>
        <PageHeader title={t('facts')} back={back} />
        {error ? <ErrorState error={error} onRetry={() => void mutate()} /> : <Loading rows={6} />}
      </Page>
    );
  }
  return (
    <Page>
      <PageHeader
        title={t('unitTitle', { unit: trailer.unit })}
        lead={`${t(`common:body.${trailer.bodyType}`)}, ${trailer.fleet}`}
        back={back}
        actions={<Actions trailer={trailer} />}
      />
      {trailer.bodyType === 'tank' && (
        <Callout tone="caution" title={t('tankTitle')}>
          {t('tankWords')}
        </Callout>
      )}
      <Columns>
        <Column>
          <TrailerFacts trailer={trailer} />
          <TrailerHistory trailerId={trailer.id} />
        </Column>
        <TrailerPlan trailer={trailer} />
      </Columns>
    </Page>
  );
}
