import { chakra } from '@chakra-ui/react';
import { Info, TriangleAlert, CircleCheck } from 'lucide-react';
import type { ReactNode } from 'react';

const Root = chakra('div', {
  base: {
    display: 'flex',
    gap: '3.5',
    alignItems: 'flex-start',
    borderLeft: '5px solid',
    borderRadius: '0 10px 10px 0',
    px: '4',
    py: '3',
    color: 'fg',
    '& > svg': { flexShrink: '0', mt: '1px' },
  },
  variants: {
    tone: {
      caution: { bg: 'ember.wash', borderColor: 'ember.mark', '& > svg': { color: 'ember.fg' } },
      next: { bg: 'amber.wash', borderColor: 'amber.mark', '& > svg': { color: 'amber.fg' } },
      note: { bg: 'slate.wash', borderColor: 'slate.mark', '& > svg': { color: 'slate.fg' } },
      done: { bg: 'pine.wash', borderColor: 'pine.mark', '& > svg': { color: 'pine.fg' } },
    },
  },
  defaultVariants: { tone: 'note' },
});
const Title = chakra('strong', { base: { display: 'block', fontWeight: 'bold' } });

const icons = { caution: TriangleAlert, next: Info, note: Info, done: CircleCheck } as const;

export interface CalloutProps {
  tone?: keyof typeof icons;
  title?: ReactNode;
  children?: ReactNode;
  /** `alert` is read out at once, `status` when the reader is free. */
  role?: 'alert' | 'status' | 'note';
}

/** Something to heed, beside the step it is about. */
export function Callout({ tone = 'note', title, children, role }: CalloutProps) {
  const Icon = icons[tone];
  return (
    <Root tone={tone} role={role}>
      <Icon size={22} aria-hidden />
      <div>
        {title && <Title>{title}</Title>}
        {children}
      </div>
    </Root>
  );
}
