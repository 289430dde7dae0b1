import { chakra } from '@chakra-ui/react';
import type { TrailerDto } from '@lampwright/contracts';
import { useTranslation } from 'react-i18next';
import { formatLength } from '../../lib/format';
import { useAccount } from '../../lib/session-context';
import { Facts, Panel, SectionTitle } from '../../ui';

const Notes = chakra('p', {
  base: { borderTop: '1px solid', borderColor: 'line', pt: '4', whiteSpace: 'pre-line' },
});

export function TrailerFacts({ trailer }: { trailer: TrailerDto }) {
  const { t } = useTranslation(['trailers', 'common']);
  const { lengths } = useAccount().preferences;
  const sources = trailer.secondSources.map((source) => t(`common:secondSource.${source}`));
  return (
    <Panel>
      <SectionTitle>{t('facts')}</SectionTitle>
      <Facts
        facts={[
          [t('length'), formatLength(trailer.lengthMetres, lengths)],
          [t('width'), formatLength(trailer.widthMetres, lengths)],
          [t('year'), trailer.year],
          [t('plate'), trailer.plate ?? t('noPlate')],
          [t('abs'), t(trailer.abs ? 'absYes' : 'absNo')],
          [t('secondSources'), sources.join(', ') || t('noSecondSources')],
        ]}
      />
      {trailer.notes && <Notes>{trailer.notes}</Notes>}
    </Panel>
  );
}
