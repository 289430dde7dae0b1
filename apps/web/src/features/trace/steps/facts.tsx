import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const List = chakra('dl', {
  base: {
    display: 'grid',
    gridTemplateColumns: 'minmax(7rem, auto) 1fr',
    columnGap: '4',
    rowGap: '2',
    fontSize: 'md',
    '& dt': { color: 'fg.muted' },
    '& dd': { fontWeight: 'semibold', overflowWrap: 'anywhere' },
  },
});

interface Fact {
  key: string;
  name: string;
  value: ReactNode;
}

/** Names and values in two columns. */
export function Facts({ facts }: { facts: readonly Fact[] }) {
  return (
    <List>
      {facts.map(({ key, name, value }) => (
        <div key={key} style={{ display: 'contents' }}>
          <dt>{name}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </List>
  );
}
