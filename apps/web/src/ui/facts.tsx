import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const List = chakra('dl', {
  base: {
    display: 'grid',
    gridTemplateColumns: 'fit-content(11rem) 1fr',
    columnGap: '5',
    rowGap: '2.5',
    '& dt': { color: 'fg.muted' },
    '& dd': { fontWeight: 'medium', overflowWrap: 'anywhere' },
  },
});

/** Names and values, one below the other. */
export function Facts({ facts }: { facts: readonly [name: string, value: ReactNode][] }) {
  return (
    <List>
      {facts.map(([name, value]) => (
        <div key={name} style={{ display: 'contents' }}>
          <dt>{name}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </List>
  );
}
