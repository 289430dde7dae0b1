import { chakra } from '@chakra-ui/react';
import { useSyncExternalStore } from 'react';
import { Callout } from '../../../ui';
import { FieldButton } from '../controls/field-button';
import type { TraceStore } from '../store/trace-store';
import { useTraceWords } from '../words/use-trace-words';

const Column = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', gap: 'touch', paddingX: '5', paddingTop: '4' },
});
const Items = chakra('ul', { base: { paddingInlineStart: '5', marginY: '2', listStyle: 'disc' } });

/** What stands in the way of recording: a rule that said no, a device that is full, or what the server refused. */
export function Trouble({ store }: { store: TraceStore }) {
  const t = useTraceWords();
  const { problem, refused, failure } = useSyncExternalStore(store.subscribe, store.getSync);
  if (!problem && refused.length === 0 && failure !== 'turnedAway') return null;
  return (
    <Column>
      {problem && (
        <Callout tone="caution" role="alert">
          {problem === 'notKept' ? t('sync.notKept') : t(`refusal.${problem.reason}`)}
        </Callout>
      )}
      {failure === 'turnedAway' && (
        <Callout tone="caution" role="alert">
          {t('sync.turnedAway')}
        </Callout>
      )}
      {refused.length > 0 && (
        <Callout tone="caution" role="alert" title={t('sync.refusedTitle')}>
          <p>{t('sync.refusedWhy')}</p>
          <Items>
            {refused.map(({ event, refusal }) => (
              <li key={event.id}>
                {t('sync.refusedItem', {
                  what: t(`event.${event.type}`),
                  why: t(`refusal.${refusal.reason}`),
                })}
              </li>
            ))}
          </Items>
          <FieldButton onTap={() => void store.forgetRefused()}>{t('sync.refusedOk')}</FieldButton>
        </Callout>
      )}
    </Column>
  );
}
