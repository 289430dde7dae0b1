import { Plus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useTraces } from '../../lib/api/traces';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { useListQuery } from '../../lib/use-list-query';
import {
  Button,
  EmptyState,
  ErrorState,
  LinkButton,
  Loading,
  Page,
  PageHeader,
  Pagination,
} from '../../ui';
import { TraceFilters } from './trace-filters';
import { TRACE_FILTERS, toTraceQuery } from './trace-query';
import { TraceTable } from './trace-table';

export function TracesPage() {
  const { t } = useTranslation('traces');
  const { query, set, narrowed } = useListQuery(TRACE_FILTERS, { sort: '-openedAt' });
  const { data, error, mutate } = useTraces(toTraceQuery(query));
  const start = useMay('traces.run') && (
    <LinkButton to={paths.newTrace()} look="primary" icon={Plus}>
      {t('start')}
    </LinkButton>
  );
  const clear = () =>
    set({
      ...Object.fromEntries(TRACE_FILTERS.map((name) => [name, undefined])),
      search: undefined,
    });
  return (
    <Page>
      <PageHeader title={t('title')} actions={start} />
      <TraceFilters query={query} set={set} />
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={6} />
      ) : data.total === 0 && narrowed ? (
        <EmptyState
          title={t('nothingTitle')}
          action={<Button onClick={clear}>{t('clearFilters')}</Button>}
        >
          {t('nothingWords')}
        </EmptyState>
      ) : data.total === 0 ? (
        <EmptyState title={t('emptyTitle')} action={start}>
          {t('emptyWords')}
        </EmptyState>
      ) : (
        <>
          <TraceTable
            traces={data.items}
            sort={query.sort ?? ''}
            onSort={(sort) => set({ sort })}
          />
          <Pagination {...data} onPage={(page) => set({ page })} />
        </>
      )}
    </Page>
  );
}
