import type { Harness, Part } from '@lampwright/harness';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { formatDuration, formatLength } from '../../lib/format';
import { useAccount } from '../../lib/session-context';
import { Panel, SectionTitle, Table, type Column } from '../../ui';

export function PartTable({ harness }: { harness: Harness }) {
  const { t } = useTranslation('plans');
  const { lengths } = useAccount().preferences;
  const columns = useMemo<Column<Part>[]>(
    () => [
      { key: 'label', header: t('part'), cell: ({ label }) => label },
      { key: 'kind', header: t('kind'), cell: ({ kind }) => t(`partKind.${kind}`) },
      {
        key: 'along',
        header: t('along'),
        align: 'end',
        cell: ({ at }) => formatLength(at.along, lengths),
      },
      {
        key: 'opens',
        header: t('opens'),
        cell: ({ separable }) =>
          separable
            ? t('opensIn', {
                open: formatDuration(separable.openSeconds),
                close: formatDuration(separable.closeSeconds),
              })
            : t('opensNot'),
      },
      { key: 'where', header: t('where'), cell: ({ where }) => where ?? t('notStated') },
    ],
    [t, lengths],
  );
  return (
    <Panel>
      <SectionTitle>{t('parts')}</SectionTitle>
      <Table caption={t('parts')} columns={columns} rows={harness.parts} keyOf={({ id }) => id} />
    </Panel>
  );
}
