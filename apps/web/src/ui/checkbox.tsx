import { chakra, type HTMLChakraProps } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Row = chakra('label', {
  base: {
    display: 'flex',
    alignItems: 'center',
    gap: '3.5',
    minH: 'field',
    px: '4',
    py: '2.5',
    bg: 'bg.panel',
    border: '1.5px solid',
    borderColor: 'edge',
    borderRadius: 'md',
    cursor: 'pointer',
    fontSize: 'lg',
    '&:has(:checked)': { borderColor: 'pine.mark', bg: 'pine.wash' },
    '&:has(:focus-visible)': { outline: '3px solid', outlineColor: 'focus', outlineOffset: '2px' },
    '& input': {
      w: '26px',
      h: '26px',
      flexShrink: '0',
      accentColor: 'var(--chakra-colors-pine-mark)',
      outline: 'none',
    },
  },
});
const Hint = chakra('span', { base: { display: 'block', color: 'fg.muted', fontSize: 'sm' } });

export interface CheckboxProps extends Omit<HTMLChakraProps<'input'>, 'type' | 'children'> {
  children: ReactNode;
  hint?: ReactNode;
}

/** A tick with its words in one big target. */
export function Checkbox({ children, hint, ...rest }: CheckboxProps) {
  return (
    <Row>
      <chakra.input type="checkbox" {...rest} />
      <span>
        {children}
        {hint && <Hint>{hint}</Hint>}
      </span>
    </Row>
  );
}
