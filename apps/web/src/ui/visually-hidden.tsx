import { chakra } from '@chakra-ui/react';

/** Read out, not shown. */
export const VisuallyHidden = chakra('span', {
  base: {
    position: 'absolute',
    w: '1px',
    h: '1px',
    m: '-1px',
    p: '0',
    overflow: 'hidden',
    clip: 'rect(0 0 0 0)',
    whiteSpace: 'nowrap',
    border: '0',
  },
});
