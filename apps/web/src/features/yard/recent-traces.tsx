import { useTranslation } from 'react-i18next';
import { useTraces } from '../../lib/api/traces';
import { formatDate } from '../../lib/format';
import { paths } from '../../lib/paths';
import { EmptyState, ErrorState, Loading } from '../../ui';
import { CardLink, CardList, Line, Unit } from './card-list';
import { Section } from './section';

/** The traces that were signed last. */
export function RecentTraces() {
  const { t } = useTranslation('yard');
  const { data, error, mutate } = useTraces({ state: 'signed', sort: '-signedAt', size: 4 });
  return (
    <Section title={t('recent')}>
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={3} />
      ) : data.items.length === 0 ? (
        <EmptyState title={t('recentEmpty')}>{t('recentEmptyWords')}</EmptyState>
      ) : (
        <CardList>
          {data.items.map((trace) => (
            <li key={trace.id}>
              <CardLink to={paths.trace(trace.id)}>
                <span>
                  <Unit>{trace.trailer.unit}</Unit>
                  <Line color="fg">{trace.found ?? trace.complaint}</Line>
                </span>
                <Line flexShrink="0">{trace.signedAt && formatDate(trace.signedAt)}</Line>
              </CardLink>
            </li>
          ))}
        </CardList>
      )}
    </Section>
  );
}
