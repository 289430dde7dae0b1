import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';

export const CardList = chakra('ul', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    gap: 'touch',
    listStyle: 'none',
    p: '0',
    m: '0',
  },
});

/** A row that is one big target. */
export const CardLink = chakra(Link, {
  base: {
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '4',
    minH: 'answer',
    px: { base: '4', md: '5' },
    py: '3.5',
    bg: 'bg.panel',
    border: '1px solid',
    borderColor: 'line',
    borderRadius: 'lg',
    color: 'fg',
    _active: { bg: 'bg.sunken' },
    _hover: { borderColor: 'edge' },
  },
});

export const Unit = chakra('strong', {
  base: {
    display: 'block',
    fontSize: 'xl',
    fontWeight: 'bold',
    lineHeight: '1.15',
    letterSpacing: '-0.01em',
  },
});

export const Line = chakra('span', {
  base: { display: 'block', color: 'fg.muted', lineHeight: '1.3' },
});
