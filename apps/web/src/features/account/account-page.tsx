import { chakra } from '@chakra-ui/react';
import { LogOut } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useSession } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { Button, Page, PageHeader, Panel, SectionTitle } from '../../ui';
import { NameForm } from './name-form';
import { OwnDevices } from './own-devices';
import { PasswordForm } from './password-form';
import { PreferencesForm } from './preferences-form';

const Columns = chakra('div', {
  base: {
    display: 'grid',
    gap: '6',
    gridTemplateColumns: { base: '1fr', lg: '1fr 1fr' },
    alignItems: 'start',
  },
});
const Column = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', gap: '6', minW: '0' },
});
const Small = chakra('p', { base: { color: 'fg.muted' } });

export function AccountPage() {
  const { t } = useTranslation('account');
  const { signOut } = useSession();
  const { run, busy } = useAction(signOut);
  return (
    <Page>
      <PageHeader title={t('title')} />
      <Columns>
        <Column>
          <Panel>
            <SectionTitle>{t('you')}</SectionTitle>
            <NameForm />
          </Panel>
          <Panel>
            <SectionTitle>{t('preferences')}</SectionTitle>
            <PreferencesForm />
          </Panel>
        </Column>
        <Column>
          <Panel>
            <SectionTitle>{t('password')}</SectionTitle>
            <PasswordForm />
          </Panel>
          <Panel>
            <SectionTitle>{t('devices')}</SectionTitle>
            <OwnDevices />
          </Panel>
          <Panel>
            <Small>{t('signOutWords')}</Small>
            <div>
              <Button icon={LogOut} busy={busy} onClick={() => void run()}>
                {t('signOut')}
              </Button>
            </div>
          </Panel>
        </Column>
      </Columns>
    </Page>
  );
}
