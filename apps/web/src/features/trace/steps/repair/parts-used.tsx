import type { PartUsed } from '@lampwright/trace';
import { FieldButton } from '../../controls/field-button';
import { Ask, Pairs } from '../../controls/panel';
import { Stepper } from '../../controls/stepper';
import { useTraceWords } from '../../words/use-trace-words';
import { partChoices } from './choices';

interface PartsUsedProps {
  parts: readonly PartUsed[];
  onChange: (parts: PartUsed[]) => void;
}

/** Parts by a touch each; the quantity by steps, and one fewer than one takes the part out. */
export function PartsUsed({ parts, onChange }: PartsUsedProps) {
  const t = useTraceWords();
  const add = (name: string) => onChange([...parts, { name, quantity: 1 }]);
  const change = (name: string, quantity: number) =>
    onChange(
      parts
        .map((part) => (part.name === name ? { name, quantity } : part))
        .filter((part) => part.quantity > 0),
    );
  return (
    <div role="group" aria-label={t('repair.parts')}>
      <Ask>{t('repair.parts')}</Ask>
      {parts.map(({ name, quantity }) => (
        <Stepper
          key={name}
          label={name}
          value={quantity}
          moreLabel={`${t('repair.more')}: ${name}`}
          fewerLabel={`${t('repair.fewer')}: ${name}`}
          onChange={(value) => change(name, value)}
        />
      ))}
      <Pairs marginTop="2">
        {partChoices
          .map((id) => t(`repair.partChoices.${id}`))
          .filter((name) => !parts.some((part) => part.name === name))
          .map((name) => (
            <FieldButton key={name} onTap={() => add(name)}>
              {name}
            </FieldButton>
          ))}
      </Pairs>
    </div>
  );
}
