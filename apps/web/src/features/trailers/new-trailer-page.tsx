import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { createTrailer } from '../../lib/api/trailers';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { useRevalidate } from '../../lib/use-revalidate';
import { Callout, Page, PageHeader, toast } from '../../ui';
import { TrailerForm } from './trailer-form';

export function NewTrailerPage() {
  const { t } = useTranslation('trailers');
  const navigate = useNavigate();
  const revalidate = useRevalidate();
  const { run, busy, error } = useAction(createTrailer);
  const allowed = useMay('trailers.write');
  return (
    <Page width="reading">
      <PageHeader title={t('newTitle')} back={{ to: paths.trailers(), label: t('back') }} />
      {allowed ? (
        <TrailerForm
          submitWords={t('create')}
          busy={busy}
          error={error}
          onSubmit={run}
          onDone={({ id, unit }) => {
            toast(t('created', { unit }));
            void revalidate('trailers');
            void navigate(paths.trailer(id));
          }}
        />
      ) : (
        <Callout>{t('notAllowed')}</Callout>
      )}
    </Page>
  );
}
