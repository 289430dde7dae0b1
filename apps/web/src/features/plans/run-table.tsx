import type { Harness, Run } from '@lampwright/harness';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { formatLength } from '../../lib/format';
import { useAccount } from '../../lib/session-context';
import { Panel, SectionTitle, Table, type Column } from '../../ui';

export function RunTable({ harness }: { harness: Harness }) {
  const { t } = useTranslation('plans');
  const { lengths } = useAccount().preferences;
  const columns = useMemo<Column<Run>[]>(() => {
    const labels = new Map(harness.parts.map(({ id, label }) => [id, label]));
    const names = new Map(harness.circuits.map(({ id, name }) => [id, name]));
    return [
      { key: 'from', header: t('from'), cell: ({ from }) => labels.get(from) ?? from },
      { key: 'to', header: t('to'), cell: ({ to }) => labels.get(to) ?? to },
      {
        key: 'circuits',
        header: t('circuits'),
        cell: ({ circuits }) => circuits.map((id) => names.get(id) ?? id).join(', '),
      },
      {
        key: 'length',
        header: t('runLength'),
        align: 'end',
        cell: ({ metres }) => formatLength(metres, lengths),
      },
    ];
  }, [harness, t, lengths]);
  return (
    <Panel>
      <SectionTitle>{t('runs')}</SectionTitle>
      <Table caption={t('runs')} columns={columns} rows={harness.runs} keyOf={({ id }) => id} />
    </Panel>
  );
}
