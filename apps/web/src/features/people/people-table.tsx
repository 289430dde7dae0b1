import type { PersonDto } from '@lampwright/contracts';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { formatDateTime } from '../../lib/format';
import { Button, StatusPill, Table, type Column } from '../../ui';

export interface PeopleTableProps {
  people: readonly PersonDto[];
  sort: string;
  onSort: (sort: string) => void;
  onManage: (person: PersonDto) => void;
}

export function PeopleTable({ people, sort, onSort, onManage }: PeopleTableProps) {
  const { t } = useTranslation(['people', 'common']);
  const columns = useMemo<Column<PersonDto>[]>(
    () => [
      { key: 'name', header: t('name'), sort: 'name', cell: ({ name }) => <strong>{name}</strong> },
      {
        key: 'role',
        header: t('role'),
        sort: 'role',
        cell: ({ role }) => t(`common:role.${role}`),
      },
      { key: 'email', header: t('email'), sort: 'email', cell: ({ email }) => email },
      {
        key: 'last',
        header: t('lastSignIn'),
        sort: 'lastSignInAt',
        cell: ({ lastSignInAt }) => (lastSignInAt ? formatDateTime(lastSignInAt) : t('never')),
      },
      {
        key: 'state',
        header: t('state'),
        cell: ({ closed }) => (closed ? <StatusPill>{t('closed')}</StatusPill> : t('open')),
      },
      {
        key: 'manage',
        header: '',
        align: 'end',
        cell: (person) => (
          <Button
            size="office"
            aria-label={t('manageName', { name: person.name })}
            onClick={() => onManage(person)}
          >
            {t('manage')}
          </Button>
        ),
      },
    ],
    [t, onManage],
  );
  return (
    <Table
      caption={t('caption')}
      columns={columns}
      rows={people}
      keyOf={({ id }) => id}
      sort={sort}
      onSort={onSort}
    />
  );
}
