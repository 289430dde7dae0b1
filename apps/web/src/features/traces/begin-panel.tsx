import { chakra } from '@chakra-ui/react';
import { ArrowRight } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { uuidv7 } from 'uuidv7';
import { openTrace } from '../../lib/api/traces';
import { useTrailer } from '../../lib/api/trailers';
import { paths } from '../../lib/paths';
import { useAction } from '../../lib/use-action';
import { useRevalidate } from '../../lib/use-revalidate';
import { Button, Callout, ErrorState, LinkButton, Loading } from '../../ui';

/** Stays at the foot of the screen, under the thumb, while the cards scroll. */
const Foot = chakra('div', {
  base: {
    position: 'sticky',
    bottom: { base: 'calc(69px + env(safe-area-inset-bottom))', md: '0' },
    bg: 'bg.canvas',
    borderTop: '1px solid',
    borderColor: 'line',
    py: '4',
    display: 'flex',
    flexDirection: 'column',
    gap: 'touch',
  },
});
const Words = chakra('p', { base: { mb: '3' } });
const Small = chakra('p', { base: { color: 'fg.muted', fontSize: 'sm' } });

/** What can be done with the chosen trailer: start, carry on, or why not. */
export function BeginPanel({ trailerId }: { trailerId: string }) {
  const { t } = useTranslation('traces');
  const navigate = useNavigate();
  const revalidate = useRevalidate();
  const { data: trailer, error, mutate } = useTrailer(trailerId);
  // One id for every try, so that a request that got through unseen does not open a second trace.
  const [id] = useState(() => uuidv7());
  const { run, busy, error: refused } = useAction(openTrace);

  if (error) return <ErrorState error={error} onRetry={() => void mutate()} />;
  if (!trailer) return <Loading rows={1} />;
  const { unit, openTraceId } = trailer;

  if (trailer.bodyType === 'tank') {
    return (
      <Callout tone="caution" role="alert" title={t('newTank')}>
        {t('newTankWords')}
      </Callout>
    );
  }
  if (!trailer.plan) {
    return (
      <Callout role="status" title={t('newNoPlan', { unit })}>
        <Words>{t('newNoPlanWords')}</Words>
        <LinkButton to={paths.editTrailer(trailer.id)}>{t('givePlan')}</LinkButton>
      </Callout>
    );
  }

  const begin = async () => {
    const opened = await run({ id, trailerId: trailer.id });
    if (!opened?.ok) return;
    void revalidate('traces', 'trailers');
    await navigate(paths.trace(opened.value.id));
  };

  return (
    <Foot>
      {refused !== null && <ErrorState error={refused} />}
      {openTraceId && (
        <>
          <Callout tone="next" role="status" title={t('newOpen', { unit })}>
            {t('newOpenWords')}
          </Callout>
          <LinkButton to={paths.trace(openTraceId)} look="primary" wide icon={ArrowRight}>
            {t('carryOn')}
          </LinkButton>
        </>
      )}
      <Button
        look={openTraceId ? 'secondary' : 'primary'}
        size={openTraceId ? 'field' : 'answer'}
        wide
        busy={busy}
        icon={ArrowRight}
        onClick={() => void begin()}
      >
        {openTraceId ? t('beginAnother') : t('begin', { unit })}
      </Button>
      <Small>{t('advice')}</Small>
    </Foot>
  );
}
