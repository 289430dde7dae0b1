import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useTrailer, useTrailers } from '../../lib/api/trailers';
import { paths } from '../../lib/paths';
import { EmptyState, ErrorState, LinkButton, Loading, RadioCards, SearchBox } from '../../ui';

export interface TrailerPickerProps {
  chosen: string | null;
  onChoose: (id: string) => void;
}

/** The trailers as big cards; the chosen one stays in view whatever is searched for. */
export function TrailerPicker({ chosen, onChoose }: TrailerPickerProps) {
  const { t } = useTranslation(['traces', 'common']);
  const [search, setSearch] = useState('');
  const { data, error, mutate } = useTrailers({ search, sort: 'unit', size: 8 });
  const picked = useTrailer(chosen).data;

  const shown = useMemo(() => {
    const items = data?.items ?? [];
    return picked && !items.some(({ id }) => id === picked.id) ? [picked, ...items] : items;
  }, [data, picked]);

  return (
    <>
      <SearchBox label={t('newSearch')} value={search} onSearch={setSearch} />
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={5} />
      ) : shown.length === 0 ? (
        <EmptyState
          title={t('newNone')}
          action={<LinkButton to={paths.newTrailer()}>{t('addTrailer')}</LinkButton>}
        >
          {t('newNoneWords')}
        </EmptyState>
      ) : (
        <RadioCards
          legend={t('newChoose')}
          columns={2}
          value={chosen}
          onChange={onChoose}
          choices={shown.map(({ id, unit, bodyType, fleet }) => ({
            value: id,
            label: unit,
            hint: `${t(`common:body.${bodyType}`)}, ${fleet}`,
          }))}
        />
      )}
    </>
  );
}
