import { chakra } from '@chakra-ui/react';
import type { Part } from '@lampwright/harness';
import type { LampResult } from '@lampwright/trace';
import { FieldButton } from '../../controls/field-button';
import { useTraceWords } from '../../words/use-trace-words';

const results: readonly LampResult[] = ['lit', 'dark', 'dim', 'wrongCircuit'];

const Card = chakra('div', {
  base: { borderTopWidth: '1px', borderColor: 'line', paddingTop: '3' },
});
const Name = chakra('p', { base: { fontSize: 'lg', fontWeight: 'semibold' } });
const Where = chakra('p', { base: { fontSize: 'sm', color: 'fg.muted' } });
const Choices = chakra('div', {
  base: { display: 'grid', gridTemplateColumns: '1fr 1fr', gap: 'touch', marginTop: '2' },
});

interface LampCardProps {
  lamp: Part;
  result: LampResult | null;
  onSay: (result: LampResult) => void;
}

/** One lamp and what is seen of it. */
export function LampCard({ lamp, result, onSay }: LampCardProps) {
  const t = useTraceWords();
  return (
    <Card role="group" aria-label={lamp.label}>
      <Name>{lamp.label}</Name>
      {lamp.where && <Where>{lamp.where}</Where>}
      <Choices>
        {results.map((each) => (
          <FieldButton
            key={each}
            name={t('lampCheck.lamp', { lamp: lamp.label, result: t(`lampCheck.result.${each}`) })}
            pressed={each === result}
            onTap={() => onSay(each)}
          >
            {t(`lampCheck.result.${each}`)}
          </FieldButton>
        ))}
      </Choices>
    </Card>
  );
}
