import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Button, type ButtonProps } from './button';

export interface AnswerProps extends Omit<ButtonProps, 'size' | 'children'> {
  children: ReactNode;
  /** What follows from this answer, in small. */
  hint?: ReactNode;
}

const Hint = chakra('span', {
  base: { display: 'block', fontWeight: 'normal', fontSize: 'md', mt: '0.5' },
});

/** One of the two or three answers to the question of a trace: at least 76 px high. */
export function Answer({ children, hint, ...rest }: AnswerProps) {
  return (
    <Button size="answer" {...rest}>
      <span>
        {children}
        {hint && <Hint>{hint}</Hint>}
      </span>
    </Button>
  );
}
