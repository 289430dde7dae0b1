import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';

/** A link within words. */
export const TextLink = chakra(Link, {
  base: {
    color: 'fg',
    textDecoration: 'underline',
    textUnderlineOffset: '3px',
    textDecorationThickness: '1.5px',
    textDecorationColor: 'edge',
    borderRadius: 'sm',
  },
});
