import type { BodyType } from '@lampwright/trace';
import { Plus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useTrailers } from '../../lib/api/trailers';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { useListQuery } from '../../lib/use-list-query';
import {
  Button,
  EmptyState,
  ErrorState,
  FilterBar,
  LinkButton,
  Loading,
  Page,
  PageHeader,
  Pagination,
  SearchBox,
  Select,
} from '../../ui';
import { BODY_TYPES } from './body-types';
import { TrailerTable } from './trailer-table';

const FILTERS = ['bodyType'] as const;

const toBodyType = (text: string | undefined): BodyType | undefined =>
  BODY_TYPES.find((body) => body === text);

export function TrailersPage() {
  const { t } = useTranslation(['trailers', 'common']);
  const { query, set, narrowed } = useListQuery(FILTERS, { sort: 'unit' });
  const bodyType = toBodyType(query.bodyType);
  const { data, error, mutate } = useTrailers({ ...query, bodyType });
  const add = useMay('trailers.write') && (
    <LinkButton to={paths.newTrailer()} icon={Plus}>
      {t('add')}
    </LinkButton>
  );
  return (
    <Page>
      <PageHeader title={t('title')} actions={add} />
      <FilterBar>
        <SearchBox
          size="office"
          label={t('common:search')}
          hint={t('searchHint')}
          value={query.search ?? ''}
          onSearch={(search) => set({ search })}
        />
        <Select
          size="office"
          label={t('bodyType')}
          value={bodyType ?? ''}
          onChange={(event) => set({ bodyType: event.target.value })}
          options={[
            { value: '', label: t('allBodies') },
            ...BODY_TYPES.map((body) => ({ value: body, label: t(`common:body.${body}`) })),
          ]}
        />
      </FilterBar>
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={6} />
      ) : data.total === 0 && narrowed ? (
        <EmptyState
          title={t('nothingTitle')}
          action={
            <Button onClick={() => set({ search: undefined, bodyType: undefined })}>
              {t('clearFilters')}
            </Button>
          }
        >
          {t('nothingWords')}
        </EmptyState>
      ) : data.total === 0 ? (
        <EmptyState title={t('emptyTitle')} action={add}>
          {t('emptyWords')}
        </EmptyState>
      ) : (
        <>
          <TrailerTable
            trailers={data.items}
            sort={query.sort ?? ''}
            onSort={(sort) => set({ sort })}
          />
          <Pagination {...data} onPage={(page) => set({ page })} />
        </>
      )}
    </Page>
  );
}
