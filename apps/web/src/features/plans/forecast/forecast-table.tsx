import { chakra } from '@chakra-ui/react';
import type { Harness } from '@lampwright/harness';
import { DEFAULT_TIMING } from '@lampwright/isolation';
import { CircleCheck } from 'lucide-react';
import { useMemo, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { ErrorState, Panel, SectionTitle, Table, type Column } from '../../../ui';
import type { CircuitForecast } from '../../../lib/planner';
import { VisuallyHidden } from '../../../ui/visually-hidden';
import type { CircuitOutlook } from './forecast-circuits';
import { useForecasts } from './use-forecasts';

const Lead = chakra('p', { base: { color: 'fg.muted', maxW: '75ch' } });
const Notes = chakra('ul', {
  base: { color: 'fg.muted', fontSize: 'sm', listStyle: 'none', maxW: '90ch' },
});
const Limit = chakra('span', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    verticalAlign: 'top',
    gap: '1.5',
    '& svg': { color: 'pine.fg' },
  },
});
/** Most circuits are worked out before anyone could read this, so it takes a moment to appear. */
const Later = chakra('span', {
  base: { color: 'fg.muted', animation: 'arrive 160ms ease-out 150ms backwards' },
});

/** What finding a short will take on each circuit, beside the best there can be and the usual habits. */
export function ForecastTable({ harness }: { harness: Harness }) {
  const { t } = useTranslation('plans');
  const { circuits, failure, working, retry } = useForecasts(harness);
  const columns = useColumns(working);
  const { powerSeconds, walkSecondsPerMetre } = DEFAULT_TIMING;
  return (
    <Panel aria-busy={working}>
      <SectionTitle>{t('forecast.title')}</SectionTitle>
      <Lead>{t('forecast.lead')}</Lead>
      {failure && <ErrorState error={failure.error} onRetry={retry} />}
      <Table
        caption={t('forecast.title')}
        columns={columns}
        rows={circuits}
        keyOf={({ circuit }) => circuit}
      />
      <Notes>
        <li>{t('forecast.aboutLimit')}</li>
        <li>
          <Limit>
            <CircleCheck size={18} aria-hidden /> {t('forecast.aboutProof')}
          </Limit>
        </li>
        <li>{t('forecast.aboutHabits')}</li>
        <li>{t('forecast.aboutTimes', { powerSeconds, walkSecondsPerMetre })}</li>
      </Notes>
    </Panel>
  );
}

function useColumns(working: boolean): Column<CircuitOutlook>[] {
  const { t, i18n } = useTranslation('plans');
  return useMemo(() => {
    const number = new Intl.NumberFormat(i18n.language, {
      minimumFractionDigits: 1,
      maximumFractionDigits: 1,
    });
    const minutes = (seconds: number) =>
      t('forecast.minutes', { minutes: number.format(seconds / 60) });
    const figure = (
      key: string,
      header: string,
      show: (forecast: CircuitForecast) => ReactNode,
    ): Column<CircuitOutlook> => ({
      key,
      header,
      align: 'end',
      nowrap: true,
      cell: ({ forecast, sections }) => {
        if (forecast) return show(forecast);
        return sections > 1 && working ? (
          <Later>{t('forecast.working')}</Later>
        ) : (
          <>
            <span aria-hidden>{'–'}</span>
            <VisuallyHidden>
              {t(sections > 1 ? 'forecast.missing' : 'forecast.nothingToPart')}
            </VisuallyHidden>
          </>
        );
      },
    });
    return [
      { key: 'circuit', header: t('forecast.circuit'), cell: ({ name }) => name },
      figure('expected', t('forecast.expected'), (f) => minutes(f.expectedSeconds)),
      figure('worst', t('forecast.worst'), (f) => minutes(f.worstSeconds)),
      figure('powerUps', t('forecast.powerUps'), (f) => number.format(f.expectedPowerUps)),
      figure('limit', t('forecast.limit'), (f) => (
        <Limit>
          {f.proven && (
            <>
              <CircleCheck size={18} aria-hidden />
              <VisuallyHidden>{t('forecast.proven')} </VisuallyHidden>
            </>
          )}
          {minutes(f.lowerBoundSeconds)}
        </Limit>
      )),
      figure('easiest', t('forecast.oneByOne'), (f) => minutes(f.easiestFirstSeconds)),
      figure('half', t('forecast.halving'), (f) => minutes(f.halfByCountSeconds)),
    ];
  }, [t, i18n.language, working]);
}
