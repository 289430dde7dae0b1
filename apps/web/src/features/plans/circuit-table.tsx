import type { Circuit, Harness } from '@lampwright/harness';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { Panel, SectionTitle, Table, type Column } from '../../ui';

export function CircuitTable({ harness }: { harness: Harness }) {
  const { t } = useTranslation('plans');
  const columns = useMemo<Column<Circuit>[]>(
    () => [
      { key: 'name', header: t('name'), cell: ({ name }) => name },
      { key: 'pin', header: t('pin'), align: 'end', cell: ({ pin }) => pin ?? t('notStated') },
      { key: 'colour', header: t('colour'), cell: ({ colour }) => colour ?? t('notStated') },
      {
        key: 'protection',
        header: t('protection'),
        cell: ({ protection }) =>
          protection
            ? t('protectionWords', {
                amps: protection.amps,
                kind: t(`protectionKind.${protection.kind}`),
              })
            : t('notStated'),
      },
    ],
    [t],
  );
  return (
    <Panel>
      <SectionTitle>{t('circuits')}</SectionTitle>
      <Table
        caption={t('circuits')}
        columns={columns}
        rows={harness.circuits}
        keyOf={({ id }) => id}
      />
    </Panel>
  );
}
