import { chakra } from '@chakra-ui/react';
import { Check, CloudOff, LogIn, RefreshCw, TriangleAlert } from 'lucide-react';
import { useSyncExternalStore } from 'react';
import { FieldButton } from '../controls/field-button';
import type { SyncState, TraceStore } from '../store/trace-store';
import { useTraceWords } from '../words/use-trace-words';

const Line = chakra('span', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '2',
    fontSize: 'sm',
    fontWeight: 'semibold',
    whiteSpace: 'nowrap',
  },
});

const icons = {
  sent: Check,
  sending: RefreshCw,
  waiting: CloudOff,
  signIn: LogIn,
  attention: TriangleAlert,
};

type SentKind = keyof typeof icons;

function kindOf({ waiting, sending, failure, refused }: SyncState): SentKind {
  if (refused.length > 0 || failure === 'turnedAway') return 'attention';
  if (waiting === 0) return 'sent';
  if (failure === 'signIn') return 'signIn';
  return sending ? 'sending' : 'waiting';
}

/** Whether what was recorded here has reached the server, in words. While it waits, a touch sends it. */
export function SentState({ store }: { store: TraceStore }) {
  const t = useTraceWords();
  const sync = useSyncExternalStore(store.subscribe, store.getSync);
  const kind = kindOf(sync);
  const Icon = icons[kind];
  const words =
    kind === 'sent' || kind === 'attention'
      ? t(`sync.${kind}`)
      : t(`sync.${kind}`, { count: sync.waiting });
  if (kind === 'sent' || kind === 'sending') {
    return (
      <Line>
        <Icon aria-hidden size={18} />
        {words}
      </Line>
    );
  }
  return (
    <FieldButton icon={Icon} fontSize="sm" onTap={() => void store.send()} title={t('sync.retry')}>
      {words}
    </FieldButton>
  );
}
