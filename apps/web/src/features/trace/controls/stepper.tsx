import { chakra } from '@chakra-ui/react';
import { Minus, Plus } from 'lucide-react';
import { FieldButton } from './field-button';

interface StepperProps {
  label: string;
  value: number;
  step?: number;
  least?: number;
  moreLabel: string;
  fewerLabel: string;
  onChange: (value: number) => void;
}

const Line = chakra('div', {
  base: { display: 'flex', alignItems: 'center', gap: 'touch', flexWrap: 'wrap' },
});

const Value = chakra('output', {
  base: { minWidth: '3ch', textAlign: 'center', fontSize: 'xl', fontWeight: 'semibold' },
});

const Label = chakra('span', { base: { flex: '1', fontSize: 'md', fontWeight: 'semibold' } });

/** A number that is changed without typing. */
export function Stepper(props: StepperProps) {
  const { label, value, step = 1, least = 0, moreLabel, fewerLabel, onChange } = props;
  return (
    <Line role="group" aria-label={label}>
      <Label>{label}</Label>
      <FieldButton
        name={fewerLabel}
        icon={Minus}
        disabled={value - step < least}
        onTap={() => onChange(value - step)}
      />
      <Value>{value}</Value>
      <FieldButton name={moreLabel} icon={Plus} onTap={() => onChange(value + step)} />
    </Line>
  );
}
