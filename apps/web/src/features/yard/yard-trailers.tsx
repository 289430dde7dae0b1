import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useTrailers } from '../../lib/api/trailers';
import { paths } from '../../lib/paths';
import { EmptyState, ErrorState, Loading, SearchBox, TrailerState } from '../../ui';
import { CardLink, CardList, Line, Unit } from './card-list';
import { Section } from './section';

/** A few trailers of the yard, and a search for the others. */
export function YardTrailers() {
  const { t } = useTranslation(['yard', 'common']);
  const [search, setSearch] = useState('');
  const { data, error, mutate } = useTrailers({ search, sort: 'unit', size: 5 });
  return (
    <Section title={t('trailers')} more={{ to: paths.trailers(), label: t('allTrailers') }}>
      <SearchBox
        label={t('findTrailer')}
        hint={t('findTrailerHint')}
        value={search}
        onSearch={setSearch}
      />
      {error ? (
        <ErrorState error={error} onRetry={() => void mutate()} />
      ) : !data ? (
        <Loading rows={5} />
      ) : data.items.length === 0 ? (
        <EmptyState title={t('noTrailers')}>{t('noTrailersWords')}</EmptyState>
      ) : (
        <CardList>
          {data.items.map((trailer) => (
            <li key={trailer.id}>
              <CardLink to={paths.trailer(trailer.id)}>
                <span>
                  <Unit>{trailer.unit}</Unit>
                  <Line>
                    {t(`common:body.${trailer.bodyType}`)}, {trailer.fleet}
                  </Line>
                </span>
                <TrailerState trailer={trailer} />
              </CardLink>
            </li>
          ))}
        </CardList>
      )}
    </Section>
  );
}
