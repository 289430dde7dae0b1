import { chakra } from '@chakra-ui/react';

/** Search and pickers above a list. */
export const FilterBar = chakra('div', {
  base: {
    display: 'grid',
    gap: 'touch',
    gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 9rem), 1fr))',
    alignItems: 'end',
    '& > :first-of-type': { gridColumn: { base: '1 / -1', md: 'span 2' } },
  },
});
