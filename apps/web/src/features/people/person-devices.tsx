import { useTranslation } from 'react-i18next';
import { endPersonSession, usePersonSessions } from '../../lib/api/people';
import { DeviceList } from '../../ui';

export function PersonDevices({ personId }: { personId: string }) {
  const { t } = useTranslation('people');
  const sessions = usePersonSessions(personId);
  return (
    <DeviceList
      sessions={sessions.data}
      error={sessions.error}
      empty={t('noDevices')}
      onRetry={() => void sessions.mutate()}
      onEnd={async (id) => {
        await endPersonSession(personId, id);
        await sessions.mutate();
      }}
    />
  );
}
