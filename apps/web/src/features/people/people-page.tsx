import type { PersonDto } from '@lampwright/contracts';
import { UserPlus } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { usePeople } from '../../lib/api/people';
import { useMay } from '../../lib/session-context';
import { useListQuery } from '../../lib/use-list-query';
import {
  Button,
  Callout,
  EmptyState,
  ErrorState,
  FilterBar,
  Loading,
  Page,
  PageHeader,
  Pagination,
  SearchBox,
} from '../../ui';
import { AddPerson } from './add-person';
import { ManagePerson } from './manage-person';
import { PeopleTable } from './people-table';

const NO_FILTERS: readonly never[] = [];

function PeopleList({ onManage }: { onManage: (person: PersonDto) => void }) {
  const { t } = useTranslation(['people', 'common', 'errors']);
  const { query, set } = useListQuery(NO_FILTERS, { sort: 'name' });
  const { data, error, mutate } = usePeople(query);
  return (
    <>
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
        <EmptyState title={t('emptyTitle')}>{t('emptyWords')}</EmptyState>
      ) : (
        <>
          <PeopleTable
            people={data.items}
            sort={query.sort ?? ''}
            onSort={(sort) => set({ sort })}
            onManage={onManage}
          />
          <Pagination {...data} onPage={(page) => set({ page })} />
        </>
      )}
    </>
  );
}

export function PeoplePage() {
  const { t } = useTranslation(['people', 'common', 'errors']);
  const [adding, setAdding] = useState(false);
  const [managed, setManaged] = useState<PersonDto | null>(null);
  const mayRead = useMay('people.read');
  const mayWrite = useMay('people.write');
  return (
    <Page>
      <PageHeader
        title={t('title')}
        actions={
          mayWrite && (
            <Button icon={UserPlus} onClick={() => setAdding(true)}>
              {t('add')}
            </Button>
          )
        }
      />
      {mayRead ? (
        <PeopleList onManage={setManaged} />
      ) : (
        <Callout>{t('errors:problem.notAllowed')}</Callout>
      )}
      {adding && <AddPerson onClose={() => setAdding(false)} />}
      {managed && (
        <ManagePerson
          key={managed.id}
          person={managed}
          onChange={setManaged}
          onClose={() => setManaged(null)}
        />
      )}
    </Page>
  );
}
