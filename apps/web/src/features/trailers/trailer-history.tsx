import { chakra } from '@chakra-ui/react';
import { useTranslation } from 'react-i18next';
import { useTraces } from '../../lib/api/traces';
import { formatDate } from '../../lib/format';
import { paths } from '../../lib/paths';
import { ErrorState, Loading, Panel, SectionTitle, TextLink } from '../../ui';

const List = chakra('ul', { base: { listStyle: 'none', p: '0', m: '0' } });
const Item = chakra('li', {
  base: {
    borderTop: '1px solid',
    borderColor: 'line',
    py: '2',
    _first: { borderTop: '0', pt: '0' },
    '& a': { display: 'flex', alignItems: 'center', minH: 'office', fontWeight: 'semibold' },
  },
});
const Small = chakra('p', { base: { color: 'fg.muted', fontSize: 'sm' } });

/** What was hunted on this trailer before. */
export function TrailerHistory({ trailerId }: { trailerId: string }) {
  const { t } = useTranslation(['trailers', 'common']);
  const { data, error, mutate } = useTraces({ trailerId, sort: '-openedAt', size: 5 });
  return (
    <Panel>
      <SectionTitle>{t('history')}</SectionTitle>
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={2} />
      ) : data.items.length === 0 ? (
        <Small>{t('historyEmpty')}</Small>
      ) : (
        <List>
          {data.items.map((trace) => (
            <Item key={trace.id}>
              <TextLink to={paths.trace(trace.id)}>
                {trace.found ?? (trace.complaint || t(`common:step.${trace.step}`))}
              </TextLink>
              <Small>
                {formatDate(trace.openedAt)}, {t(`common:step.${trace.step}`)}, {trace.author.name}
              </Small>
            </Item>
          ))}
        </List>
      )}
      {data && data.total > data.items.length && (
        <TextLink to={`${paths.traces()}?trailerId=${encodeURIComponent(trailerId)}`}>
          {t('allTraces')}
        </TextLink>
      )}
    </Panel>
  );
}
