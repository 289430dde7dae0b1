import { useTranslation } from 'react-i18next';
import type { ListQuery } from '../../lib/use-list-query';
import { FilterBar, SearchBox, Select } from '../../ui';
import { STATES, STEPS, type TRACE_FILTERS } from './trace-query';
import { useTraceFacets, type Facet } from './use-trace-facets';

type Props = Pick<ListQuery<(typeof TRACE_FILTERS)[number]>, 'query' | 'set'>;

/** The chosen value stays in the list even where none of the newest traces has it. */
function withChosen(any: string, facets: Facet[], chosen: string | undefined): Facet[] {
  const missing = chosen && !facets.some(({ value }) => value === chosen);
  return [
    { value: '', label: any },
    ...facets,
    ...(missing ? [{ value: chosen, label: chosen }] : []),
  ];
}

export function TraceFilters({ query, set }: Props) {
  const { t } = useTranslation(['traces', 'common']);
  const { people, trailers, circuits } = useTraceFacets();
  const stateName = {
    open: t('stateOpen'),
    signed: t('stateSigned'),
    abandoned: t('stateAbandoned'),
  };
  const picks = [
    {
      name: 'state',
      label: t('state'),
      options: [
        { value: '', label: t('stateAny') },
        ...STATES.map((state) => ({ value: state, label: stateName[state] })),
      ],
    },
    {
      name: 'step',
      label: t('step'),
      options: [
        { value: '', label: t('stepAny') },
        ...STEPS.map((step) => ({ value: step, label: t(`common:step.${step}`) })),
      ],
    },
    {
      name: 'trailerId',
      label: t('unit'),
      options: withChosen(t('common:all'), trailers, query.trailerId),
    },
    {
      name: 'authorId',
      label: t('person'),
      options: withChosen(t('common:all'), people, query.authorId),
    },
    {
      name: 'circuit',
      label: t('circuit'),
      options: withChosen(t('common:all'), circuits, query.circuit),
    },
  ] as const;
  return (
    <FilterBar>
      <SearchBox
        size="office"
        label={t('common:search')}
        value={query.search ?? ''}
        onSearch={(search) => set({ search })}
      />
      {picks.map(({ name, label, options }) => (
        <Select
          key={name}
          size="office"
          label={label}
          options={options}
          value={query[name] ?? ''}
          onChange={(event) => set({ [name]: event.target.value })}
        />
      ))}
    </FilterBar>
  );
}
