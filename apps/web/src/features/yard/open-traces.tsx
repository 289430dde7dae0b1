import { chakra } from '@chakra-ui/react';
import { useTranslation } from 'react-i18next';
import { useTraces } from '../../lib/api/traces';
import { formatDateTime } from '../../lib/format';
import { paths } from '../../lib/paths';
import { EmptyState, ErrorState, Loading, StepTrack } from '../../ui';
import { CardLink, CardList, Line, Unit } from './card-list';
import { Section } from './section';

const SHOWN = 5;
const Side = chakra('span', { base: { flexShrink: '0' } });

/** Traces that are neither signed nor abandoned, the newest first. */
export function OpenTraces() {
  const { t } = useTranslation('yard');
  const { data, error, mutate } = useTraces({ state: 'open', sort: '-openedAt', size: SHOWN });
  const more = { to: `${paths.traces()}?state=open`, label: t('moreOpen') };
  return (
    <Section title={t('open')} {...(data && data.total > SHOWN ? { more } : {})}>
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={3} />
      ) : data.items.length === 0 ? (
        <EmptyState title={t('openEmpty')}>{t('openEmptyWords')}</EmptyState>
      ) : (
        <CardList>
          {data.items.map((trace) => (
            <li key={trace.id}>
              <CardLink to={paths.trace(trace.id)} flexWrap="wrap">
                <span>
                  <Unit>{trace.trailer.unit}</Unit>
                  <Line color="fg">{trace.complaint || t('noComplaint')}</Line>
                  <Line>
                    {t('openedBy', {
                      name: trace.author.name,
                      when: formatDateTime(trace.openedAt),
                    })}
                  </Line>
                </span>
                <Side>
                  <StepTrack step={trace.step} />
                </Side>
              </CardLink>
            </li>
          ))}
        </CardList>
      )}
    </Section>
  );
}
