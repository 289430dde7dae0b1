import { chakra } from '@chakra-ui/react';
import type { NextPowerUp } from '../../store/use-next-power-up';
import { durationWords } from '../../words/duration-words';
import { useTraceWords } from '../../words/use-trace-words';
import { useReason } from './use-reason';

const Words = chakra('div', {
  base: { fontSize: 'md', lineHeight: '1.35', '& p + p': { marginTop: '1' } },
});
const Quiet = chakra('p', { base: { fontSize: 'sm', color: 'fg.muted' } });

/** Why this power-up, in real numbers, and how long the rest will take. */
export function Reason({ next }: { next: NextPowerUp }) {
  const t = useTraceWords();
  const why = useReason(next);
  const { advised, own } = next;
  const shown = own?.advice ?? advised;
  return (
    <Words>
      <p>{why}</p>
      <Quiet>
        {t('narrow.toGo', {
          about: durationWords(shown.expectedSeconds, t),
          worst: durationWords(shown.worstSeconds, t),
        })}{' '}
        {!own && proofWords(next, t)}
      </Quiet>
    </Words>
  );
}

function proofWords({ advised }: NextPowerUp, t: ReturnType<typeof useTraceWords>): string {
  if (advised.proof === 'notProven') {
    return t('narrow.bound', { bound: durationWords(advised.lowerBoundSeconds, t) });
  }
  return t(`narrow.${advised.proof}`);
}
