import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Root = chakra('div', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'flex-start',
    gap: '3',
    px: { base: '4', md: '6' },
    py: '7',
    border: '1.5px dashed',
    borderColor: 'edge',
    borderRadius: 'lg',
  },
});
const Title = chakra('p', { base: { fontWeight: 'bold', fontSize: 'lg' } });
const Words = chakra('p', { base: { color: 'fg.muted', maxW: '36rem' } });

export interface EmptyStateProps {
  title: string;
  children?: ReactNode;
  action?: ReactNode;
}

/** Nothing here, and what to do about it. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <Root>
      <Title>{title}</Title>
      {children && <Words>{children}</Words>}
      {action}
    </Root>
  );
}
