import type { TrailerDto, WriteTrailerRequest } from '@lampwright/contracts';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate, useParams } from 'react-router-dom';
import { ApiError } from '../../lib/api-error';
import { updateTrailer, useTrailer } from '../../lib/api/trailers';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { useRevalidate } from '../../lib/use-revalidate';
import { Button, Callout, ErrorState, Loading, Page, PageHeader, toast } from '../../ui';
import { TrailerForm } from './trailer-form';

const isStale = (error: unknown) =>
  error instanceof ApiError && error.fields.some(({ code }) => code === 'staleVersion');

interface EditProps {
  trailer: TrailerDto;
  /** Takes the newest version; what was typed stays in the draft. */
  onNewest: () => void;
}

function Edit({ trailer, onNewest }: EditProps) {
  const { t } = useTranslation('trailers');
  const navigate = useNavigate();
  const revalidate = useRevalidate();
  // A refetch behind the form must not slip another version under what is typed.
  const [opened] = useState(trailer);
  const { run, busy, error } = useAction((request: WriteTrailerRequest) =>
    updateTrailer(opened.id, {
      ...request,
      ...(opened.version === undefined ? {} : { version: opened.version }),
    }),
  );
  const stale = isStale(error);
  return (
    <>
      {stale && (
        <Callout tone="caution" role="alert">
          <p>{t('stale')}</p>
          <Button size="office" mt="3" onClick={onNewest}>
            {t('lookAgain')}
          </Button>
        </Callout>
      )}
      <TrailerForm
        trailer={opened}
        submitWords={t('save')}
        busy={busy}
        error={stale ? null : error}
        onSubmit={run}
        onDone={({ id, unit }) => {
          toast(t('changed', { unit }));
          void revalidate('trailers');
          void navigate(paths.trailer(id));
        }}
      />
    </>
  );
}

export function EditTrailerPage() {
  const { t } = useTranslation('trailers');
  const { id = '' } = useParams();
  const { data: trailer, error, mutate } = useTrailer(id);
  const [round, setRound] = useState(0);
  const allowed = useMay('trailers.write');
  const newest = async () => {
    await mutate();
    setRound((count) => count + 1);
  };
  return (
    <Page width="reading">
      <PageHeader
        title={trailer ? t('editTitle', { unit: trailer.unit }) : t('edit')}
        back={
          trailer
            ? { to: paths.trailer(id), label: t('backToUnit', { unit: trailer.unit }) }
            : { to: paths.trailers(), label: t('back') }
        }
      />
      {!allowed ? (
        <Callout>{t('notAllowed')}</Callout>
      ) : trailer ? (
        <Edit key={round} trailer={trailer} onNewest={() => void newest()} />
      ) : error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : (
        <Loading rows={6} />
      )}
    </Page>
  );
}
