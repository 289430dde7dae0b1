import { chakra } from '@chakra-ui/react';
import type { PartId } from '@lampwright/harness';
import type { Feed } from '@lampwright/trace';
import { Callout } from '../../../ui';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

const List = chakra('ol', {
  base: { listStyle: 'decimal', paddingInlineStart: '5', '& > li': { paddingY: '0.5' } },
});

interface OrderOfDoingProps {
  feed: Feed;
  toClose: readonly PartId[];
  toOpen: readonly PartId[];
}

/**
 * What the hands do before power goes on, in order: power off, then close, then open. Closing comes first, so that a
 * plug left hanging cannot be forgotten while another is in the hand.
 */
export function OrderOfDoing({ feed, toClose, toOpen }: OrderOfDoingProps) {
  const t = useTraceWords();
  const names = useNames();
  const steps = [
    ...toClose.map((point) => ({
      point,
      words: t('narrow.closeFirst', { points: names.part(point) }),
    })),
    ...toOpen.map((point, index) => ({
      point,
      words: t(toClose.length > 0 && index === 0 ? 'narrow.thenOpen' : 'narrow.openOnly', {
        points: names.part(point),
      }),
    })),
  ];
  // One alone has its place said under the instruction.
  const several = toOpen.length > 1;
  return (
    <Callout tone="caution" title={t(`feed.${feed.kind}.off`)}>
      <List aria-label={t('narrow.orderTitle')}>
        {steps.map(({ point, words }) => (
          <li key={point}>
            {words}
            {several && toOpen.includes(point) && ` ${names.where(point)}`}
          </li>
        ))}
      </List>
    </Callout>
  );
}
