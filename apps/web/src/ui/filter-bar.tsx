import { chakra } from '@chakra-ui/react';

/** Search and pickers above a list. */
export const FilterBar = chakra('div', {
  base: {
    display: 'grid',
    gap: 'touch',
    gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 10.5rem), 1fr))',
    alignItems: 'end',
    '& > :first-of-type': { gridColumn: { md: 'span 2' } },
  },
});
