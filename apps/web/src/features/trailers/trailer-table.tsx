import type { TrailerDto } from '@lampwright/contracts';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { formatLength } from '../../lib/format';
import { paths } from '../../lib/paths';
import { useAccount } from '../../lib/session-context';
import { Table, TextLink, TrailerState, type Column } from '../../ui';

export interface TrailerTableProps {
  trailers: readonly TrailerDto[];
  sort: string;
  onSort: (sort: string) => void;
}

export function TrailerTable({ trailers, sort, onSort }: TrailerTableProps) {
  const { t } = useTranslation(['trailers', 'common']);
  const { lengths } = useAccount().preferences;
  const columns = useMemo<Column<TrailerDto>[]>(
    () => [
      {
        key: 'unit',
        header: t('unit'),
        sort: 'unit',
        cell: ({ id, unit }) => <TextLink to={paths.trailer(id)}>{unit}</TextLink>,
      },
      {
        key: 'body',
        header: t('bodyType'),
        sort: 'bodyType',
        cell: ({ bodyType }) => t(`common:body.${bodyType}`),
      },
      {
        key: 'length',
        header: t('length'),
        sort: 'lengthMetres',
        align: 'end',
        cell: ({ lengthMetres }) => formatLength(lengthMetres, lengths),
      },
      { key: 'fleet', header: t('fleet'), sort: 'fleet', cell: ({ fleet }) => fleet },
      { key: 'year', header: t('year'), sort: 'year', align: 'end', cell: ({ year }) => year },
      { key: 'plan', header: t('plan'), cell: ({ plan }) => plan?.name ?? t('noPlan') },
      { key: 'state', header: t('state'), cell: (trailer) => <TrailerState trailer={trailer} /> },
    ],
    [t, lengths],
  );
  return (
    <Table
      caption={t('caption')}
      columns={columns}
      rows={trailers}
      keyOf={({ id }) => id}
      sort={sort}
      onSort={onSort}
    />
  );
}
