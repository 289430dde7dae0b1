import { chakra } from '@chakra-ui/react';

/** A sheet on the paper ground. */
export const Panel = chakra('section', {
  base: {
    bg: 'bg.panel',
    border: '1px solid',
    borderColor: 'line',
    borderRadius: 'lg',
    p: { base: '4', md: '6' },
    display: 'flex',
    flexDirection: 'column',
    gap: '4',
    minW: '0',
  },
});

export const SectionTitle = chakra('h2', { base: { fontSize: 'xl', fontWeight: 'bold' } });
