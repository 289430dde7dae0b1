import { chakra } from '@chakra-ui/react';
import type { SessionDto } from '@lampwright/contracts';
import { useTranslation } from 'react-i18next';
import { formatDateTime } from '../lib/format';
import { useAction } from '../lib/use-action';
import { Button } from './button';
import { ErrorState } from './error-state';
import { Loading } from './loading';
import { toast } from './toast';

const List = chakra('ul', { base: { listStyle: 'none', p: '0', m: '0' } });
const Item = chakra('li', {
  base: {
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '4',
    py: '2.5',
    borderTop: '1px solid',
    borderColor: 'line',
    _first: { borderTop: '0' },
  },
});
const Small = chakra('span', { base: { display: 'block', color: 'fg.muted', fontSize: 'sm' } });

export interface DeviceListProps {
  sessions: SessionDto[] | undefined;
  error: unknown;
  empty: string;
  onRetry: () => void;
  onEnd: (id: string) => Promise<void>;
}

/** The devices on which a person is signed in, each of which can be signed out. */
export function DeviceList({ sessions, error, empty, onRetry, onEnd }: DeviceListProps) {
  const { t } = useTranslation();
  const end = useAction(onEnd);
  if (error) return <ErrorState error={error} onRetry={onRetry} />;
  if (!sessions) return <Loading rows={2} />;
  if (sessions.length === 0) return <p>{empty}</p>;

  const signOut = async ({ id, deviceName }: SessionDto) => {
    const outcome = await end.run(id);
    if (outcome?.ok) toast(t('device.ended', { device: deviceName }));
  };
  return (
    <>
      {end.error !== null && <ErrorState error={end.error} />}
      <List>
        {sessions.map((session) => (
          <Item key={session.id}>
            <span>
              {session.deviceName}
              <Small>
                {session.current
                  ? t('device.this')
                  : t('device.lastUsed', { when: formatDateTime(session.lastUsedAt) })}
              </Small>
            </span>
            {!session.current && (
              <Button
                size="office"
                disabled={end.busy}
                aria-label={t('device.endName', { device: session.deviceName })}
                onClick={() => void signOut(session)}
              >
                {t('device.end')}
              </Button>
            )}
          </Item>
        ))}
      </List>
    </>
  );
}
