import type { TraceSummaryDto } from '@lampwright/contracts';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { formatDate } from '../../lib/format';
import { paths } from '../../lib/paths';
import { StatusPill, StepTrack, Table, TextLink, type Column } from '../../ui';

/** Signed and abandoned are ends; everything else is under way. */
function TraceStep({ step }: Pick<TraceSummaryDto, 'step'>) {
  const { t } = useTranslation();
  if (step === 'signed') return <StatusPill tone="done">{t('step.signed')}</StatusPill>;
  if (step === 'abandoned') return <StatusPill>{t('step.abandoned')}</StatusPill>;
  return <StepTrack step={step} />;
}

export interface TraceTableProps {
  traces: readonly TraceSummaryDto[];
  sort: string;
  onSort: (sort: string) => void;
}

export function TraceTable({ traces, sort, onSort }: TraceTableProps) {
  const { t } = useTranslation('traces');
  const columns = useMemo<Column<TraceSummaryDto>[]>(
    () => [
      {
        key: 'unit',
        header: t('unit'),
        sort: 'trailer',
        cell: ({ id, trailer }) => <TextLink to={paths.trace(id)}>{trailer.unit}</TextLink>,
      },
      {
        key: 'complaint',
        header: t('complaint'),
        cell: ({ complaint }) => complaint || t('noComplaint'),
      },
      {
        key: 'step',
        header: t('step'),
        sort: 'step',
        cell: ({ step }) => <TraceStep step={step} />,
      },
      {
        key: 'found',
        header: t('found'),
        sort: 'found',
        cell: ({ found }) => found ?? t('notFound'),
      },
      {
        key: 'powerUps',
        header: t('powerUps'),
        sort: 'powerUps',
        align: 'end',
        cell: ({ powerUps }) => powerUps,
      },
      { key: 'person', header: t('person'), sort: 'author', cell: ({ author }) => author.name },
      {
        key: 'opened',
        header: t('opened'),
        sort: 'openedAt',
        nowrap: true,
        cell: ({ openedAt }) => formatDate(openedAt),
      },
    ],
    [t],
  );
  return (
    <Table
      caption={t('caption')}
      columns={columns}
      rows={traces}
      keyOf={({ id }) => id}
      sort={sort}
      onSort={onSort}
    />
  );
}
