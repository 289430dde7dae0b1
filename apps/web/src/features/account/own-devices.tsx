import { useTranslation } from 'react-i18next';
import { endOwnSession, useOwnSessions } from '../../lib/api/account';
import { DeviceList } from '../../ui';

export function OwnDevices() {
  const { t } = useTranslation('account');
  const sessions = useOwnSessions();
  return (
    <DeviceList
      sessions={sessions.data}
      error={sessions.error}
      empty={t('noDevices')}
      onRetry={() => void sessions.mutate()}
      onEnd={async (id) => {
        await endOwnSession(id);
        await sessions.mutate();
      }}
    />
  );
}
