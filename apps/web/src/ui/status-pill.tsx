import { chakra } from '@chakra-ui/react';

/** A state in a word, with a mark whose shape says it too. */
const Root = chakra('span', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '2',
    px: '3',
    py: '1',
    borderRadius: 'full',
    fontSize: 'sm',
    fontWeight: 'semibold',
    whiteSpace: 'nowrap',
    '& i': { boxSize: '10px', flexShrink: '0' },
  },
  variants: {
    tone: {
      next: {
        bg: 'amber.wash',
        color: 'amber.fg',
        '& i': { bg: 'amber.mark', border: '2px solid', borderColor: 'amber.edge' },
      },
      done: { bg: 'pine.wash', color: 'pine.fg', '& i': { bg: 'pine.mark', borderRadius: 'full' } },
      danger: {
        bg: 'ember.wash',
        color: 'ember.fg',
        '& i': { bg: 'ember.mark', transform: 'rotate(45deg)' },
      },
      plain: {
        bg: 'slate.wash',
        color: 'slate.fg',
        '& i': { border: '2px solid', borderColor: 'slate.mark', borderRadius: 'full' },
      },
    },
  },
  defaultVariants: { tone: 'plain' },
});

export interface StatusPillProps {
  tone?: 'next' | 'done' | 'danger' | 'plain';
  children: string;
}

export function StatusPill({ tone = 'plain', children }: StatusPillProps) {
  return (
    <Root tone={tone}>
      <i aria-hidden />
      {children}
    </Root>
  );
}
