import type { PlanSummaryDto } from '@lampwright/contracts';
import { FileUp } from 'lucide-react';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { usePlans } from '../../lib/api/plans';
import { formatDate } from '../../lib/format';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { useListQuery } from '../../lib/use-list-query';
import {
  EmptyState,
  ErrorState,
  FilterBar,
  LinkButton,
  Loading,
  Page,
  PageHeader,
  Pagination,
  SearchBox,
  Table,
  TextLink,
  type Column,
} from '../../ui';

const NO_FILTERS: readonly never[] = [];

function usePlanColumns(): Column<PlanSummaryDto>[] {
  const { t } = useTranslation(['plans', 'common']);
  return useMemo(
    () => [
      {
        key: 'name',
        header: t('name'),
        sort: 'name',
        cell: ({ id, name }) => <TextLink to={paths.plan(id)}>{name}</TextLink>,
      },
      {
        key: 'circuits',
        header: t('circuits'),
        sort: 'circuits',
        align: 'end',
        cell: ({ circuits }) => circuits,
      },
      { key: 'parts', header: t('parts'), sort: 'parts', align: 'end', cell: ({ parts }) => parts },
      { key: 'revision', header: t('revision'), align: 'end', cell: ({ revision }) => revision },
      {
        key: 'updated',
        header: t('updated'),
        sort: 'updatedAt',
        cell: ({ updatedAt }) => formatDate(updatedAt),
      },
    ],
    [t],
  );
}

export function PlansPage() {
  const { t } = useTranslation(['plans', 'common']);
  const { query, set, narrowed } = useListQuery(NO_FILTERS, { sort: 'name' });
  const { data, error, mutate } = usePlans(query);
  const columns = usePlanColumns();
  const add = useMay('plans.publish') && (
    <LinkButton to={paths.importPlan()} icon={FileUp}>
      {t('import')}
    </LinkButton>
  );
  return (
    <Page>
      <PageHeader title={t('title')} lead={t('lead')} actions={add} />
      <FilterBar>
        <SearchBox
          size="office"
          label={t('common:search')}
          hint={t('searchHint')}
          value={query.search ?? ''}
          onSearch={(search) => set({ search })}
        />
      </FilterBar>
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={5} />
      ) : data.total === 0 ? (
        <EmptyState
          title={t(narrowed ? 'nothingTitle' : 'emptyTitle')}
          action={narrowed ? null : add}
        >
          {t(narrowed ? 'nothingWords' : 'emptyWords')}
        </EmptyState>
      ) : (
        <>
          <Table
            caption={t('caption')}
            columns={columns}
            rows={data.items}
            keyOf={({ id }) => id}
            sort={query.sort ?? ''}
            onSort={(sort) => set({ sort })}
          />
          <Pagination {...data} onPage={(page) => set({ page })} />
        </>
      )}
    </Page>
  );
}
