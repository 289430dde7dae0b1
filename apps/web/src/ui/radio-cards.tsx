import { chakra } from '@chakra-ui/react';
import { useId, type ComponentType, type ReactNode } from 'react';

const Set = chakra('fieldset', { base: { border: '0', p: '0', m: '0', minW: '0' } });
const Legend = chakra('legend', { base: { fontWeight: 'semibold', mb: '2', p: '0' } });
const Hint = chakra('p', { base: { color: 'fg.muted', mb: '2.5', fontSize: 'sm' } });
const Grid = chakra('div', { base: { display: 'grid', gap: 'touch' } });
const Card = chakra('label', {
  base: {
    position: 'relative',
    display: 'flex',
    alignItems: 'center',
    gap: '4',
    minH: 'answer',
    px: '5',
    py: '3',
    bg: 'bg.panel',
    border: '2px solid',
    borderColor: 'line',
    borderRadius: 'lg',
    cursor: 'pointer',
    fontSize: 'lg',
    fontWeight: 'semibold',
    lineHeight: '1.2',
    '& input': {
      position: 'absolute',
      opacity: '0',
      inset: '0',
      w: 'full',
      h: 'full',
      m: '0',
      cursor: 'pointer',
    },
    '& .dot': {
      flexShrink: '0',
      boxSize: '24px',
      borderRadius: 'full',
      border: '2px solid',
      borderColor: 'edge',
    },
    '&:has(:checked)': { borderColor: 'ink.solid' },
    '&:has(:checked) .dot': { borderWidth: '8px', borderColor: 'ink.solid' },
    '&:has(:focus-visible)': { outline: '3px solid', outlineColor: 'focus', outlineOffset: '2px' },
    '&:has(:disabled)': { cursor: 'not-allowed', opacity: '0.55' },
  },
});
const Note = chakra('span', {
  base: { display: 'block', fontWeight: 'normal', color: 'fg.muted', fontSize: 'md', mt: '0.5' },
});

interface RadioChoice<T extends string> {
  value: T;
  label: ReactNode;
  hint?: ReactNode;
  icon?: ComponentType<{ size?: number; 'aria-hidden'?: boolean }>;
  disabled?: boolean;
}

export interface RadioCardsProps<T extends string> {
  legend: ReactNode;
  hint?: ReactNode;
  choices: readonly RadioChoice<T>[];
  value: T | null;
  onChange: (value: T) => void;
  /** Most columns on a wide screen; one below 768 px. */
  columns?: number;
}

/** A choice of one, as cards that a gloved hand can hit. */
export function RadioCards<T extends string>({
  legend,
  hint,
  choices,
  value,
  onChange,
  columns = 1,
}: RadioCardsProps<T>) {
  const name = useId();
  return (
    <Set>
      <Legend>{legend}</Legend>
      {hint && <Hint>{hint}</Hint>}
      <Grid gridTemplateColumns={{ base: '1fr', md: `repeat(${columns}, minmax(0, 1fr))` }}>
        {choices.map(({ icon: Icon, ...choice }) => (
          <Card key={choice.value}>
            <input
              type="radio"
              name={name}
              value={choice.value}
              checked={choice.value === value}
              disabled={choice.disabled}
              onChange={() => onChange(choice.value)}
            />
            <span className="dot" aria-hidden />
            {Icon && <Icon size={26} aria-hidden />}
            <span>
              {choice.label}
              {choice.hint && <Note>{choice.hint}</Note>}
            </span>
          </Card>
        ))}
      </Grid>
    </Set>
  );
}
