import { chakra } from '@chakra-ui/react';
import { useTranslation } from 'react-i18next';
import { Page, PageHeader } from '../../ui';
import { OpenTraces } from './open-traces';
import { RecentTraces } from './recent-traces';
import { StartPanel } from './start-panel';
import { YardTrailers } from './yard-trailers';

const Columns = chakra('div', {
  base: {
    display: 'grid',
    gap: { base: '7', lg: '9' },
    gridTemplateColumns: { base: '1fr', lg: 'minmax(0, 1.15fr) minmax(0, 1fr)' },
    alignItems: 'start',
  },
});
const Column = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', gap: '8', minW: '0' },
});

/** The home screen: what is open, what stands here, what was signed. */
export function YardPage() {
  const { t } = useTranslation('yard');
  return (
    <Page>
      <PageHeader title={t('title')} />
      <Columns>
        <Column>
          <StartPanel />
          <OpenTraces />
          <RecentTraces />
        </Column>
        <Column>
          <YardTrailers />
        </Column>
      </Columns>
    </Page>
  );
}
