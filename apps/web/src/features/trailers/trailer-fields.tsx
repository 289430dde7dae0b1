import { chakra } from '@chakra-ui/react';
import { useMemo } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { usePlans } from '../../lib/api/plans';
import { formatLength, lengthFromField, type LengthUnit } from '../../lib/format';
import { Checkbox, Select, TextArea, TextInput } from '../../ui';
import { BODY_TYPES, SECOND_SOURCES } from './body-types';
import type { TrailerValues } from './trailer-values';

const Two = chakra('div', {
  base: {
    display: 'grid',
    gap: '5',
    gridTemplateColumns: { base: '1fr', md: '1fr 1fr' },
    alignItems: 'start',
  },
});
const Set = chakra('fieldset', { base: { border: '0', p: '0', m: '0', minW: '0' } });
const Legend = chakra('legend', { base: { fontWeight: 'semibold', p: '0', mb: '1' } });
const Hint = chakra('p', { base: { color: 'fg.muted', fontSize: 'sm', mb: '3' } });

/** Metres that the server takes. */
const LIMITS = { length: [1, 40], width: [0.5, 6] } as const;

export function TrailerFields({
  form,
  unit,
}: {
  form: UseFormReturn<TrailerValues>;
  unit: LengthUnit;
}) {
  const { t } = useTranslation(['trailers', 'common']);
  const plans = usePlans({ sort: 'name', size: 100 });
  const { errors } = form.formState;

  const between = (which: 'length' | 'width') => (text: string) => {
    const [from, to] = LIMITS[which];
    const metres = lengthFromField(text, unit);
    if (metres >= from && metres <= to) return true;
    return t(`need.${which}`, { from: formatLength(from, unit), to: formatLength(to, unit) });
  };
  const most = (count: number) => ({ value: count, message: t('need.long', { most: count }) });
  const chosenPlan = form.watch('planId');
  const planOptions = useMemo(() => {
    const known = (plans.data?.items ?? []).map(({ id, name }) => ({ value: id, label: name }));
    // While the list is on its way, or past its hundredth name, the chosen plan must not fall out of the form.
    const missing = chosenPlan !== '' && !known.some(({ value }) => value === chosenPlan);
    return [
      { value: '', label: t('planNone') },
      ...known,
      ...(missing ? [{ value: chosenPlan, label: chosenPlan }] : []),
    ];
  }, [plans.data, chosenPlan, t]);

  return (
    <>
      <Two>
        <TextInput
          label={t('unit')}
          error={errors.unit?.message}
          {...form.register('unit', {
            validate: (text) => text.trim() !== '' || t('need.unit'),
            maxLength: most(40),
          })}
        />
        <TextInput
          label={t('fleet')}
          error={errors.fleet?.message}
          {...form.register('fleet', {
            validate: (text) => text.trim() !== '' || t('need.fleet'),
            maxLength: most(100),
          })}
        />
        <Select
          label={t('bodyType')}
          options={BODY_TYPES.map((body) => ({ value: body, label: t(`common:body.${body}`) }))}
          {...form.register('bodyType')}
        />
        <TextInput
          label={t('year')}
          inputMode="numeric"
          error={errors.year?.message}
          {...form.register('year', {
            validate: (text) => /^(19\d\d|20\d\d|2100)$/.test(text.trim()) || t('need.year'),
          })}
        />
        <TextInput
          label={t(unit === 'feet' ? 'lengthFeet' : 'lengthMetres')}
          inputMode="decimal"
          error={errors.lengthMetres?.message}
          {...form.register('lengthMetres', { validate: between('length') })}
        />
        <TextInput
          label={t(unit === 'feet' ? 'widthFeet' : 'widthMetres')}
          inputMode="decimal"
          error={errors.widthMetres?.message}
          {...form.register('widthMetres', { validate: between('width') })}
        />
        <TextInput
          label={t('plate')}
          optional
          error={errors.plate?.message}
          {...form.register('plate', { maxLength: most(20) })}
        />
        <Select
          label={t('plan')}
          options={planOptions}
          error={errors.planId?.message}
          {...form.register('planId')}
        />
      </Two>
      <Set>
        <Legend>{t('secondSources')}</Legend>
        <Hint>{t('secondSourcesHint')}</Hint>
        <Two gap="touch">
          {SECOND_SOURCES.map((source) => (
            <Checkbox key={source} value={source} {...form.register('secondSources')}>
              {t(`common:secondSource.${source}`)}
            </Checkbox>
          ))}
        </Two>
      </Set>
      <Checkbox {...form.register('abs')}>{t('absBox')}</Checkbox>
      <TextArea
        label={t('notes')}
        optional
        error={errors.notes?.message}
        {...form.register('notes', { maxLength: most(4000) })}
      />
    </>
  );
}
