import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import { useMay } from '../../lib/session-context';
import { Callout, Page, PageHeader } from '../../ui';
import { BeginPanel } from './begin-panel';
import { TrailerPicker } from './trailer-picker';

/** Picks the trailer and opens the trace on it; everything after belongs to the trace itself. */
export function NewTracePage() {
  const { t } = useTranslation('traces');
  const [params, setParams] = useSearchParams();
  const trailerId = params.get('trailer');
  const allowed = useMay('traces.run');
  return (
    <Page width="reading">
      <PageHeader title={t('newTitle')} lead={t('newLead')} />
      {allowed ? (
        <>
          <TrailerPicker
            chosen={trailerId}
            onChoose={(id) =>
              setParams({ trailer: id }, { replace: true, preventScrollReset: true })
            }
          />
          {trailerId && <BeginPanel key={trailerId} trailerId={trailerId} />}
        </>
      ) : (
        <Callout title={t('traineeTitle')}>{t('traineeWords')}</Callout>
      )}
    </Page>
  );
}
