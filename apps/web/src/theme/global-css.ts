import { defineGlobalStyles } from '@chakra-ui/react';

export const globalCss = defineGlobalStyles({
  html: {
    bg: 'bg.canvas',
    color: 'fg',
    fontFamily: 'body',
    fontSize: '16px',
    lineHeight: '1.4',
    fontVariantNumeric: 'tabular-nums',
    textSizeAdjust: '100%',
  },
  body: { fontSize: 'md', minHeight: '100dvh' },
  'h1, h2, h3': { textWrap: 'balance', letterSpacing: '-0.012em', lineHeight: '1.15' },
  'h1:focus': { outline: 'none' },
  a: { touchAction: 'manipulation' },
  button: { touchAction: 'manipulation' },
  ':focus-visible': { outline: '3px solid', outlineColor: 'focus', outlineOffset: '2px' },
  '::selection': { bg: 'amber.wash', color: 'fg' },
  '::placeholder': { color: 'fg.muted', opacity: '1' },
  '*, *::before, *::after': {
    _motionReduce: {
      animationDuration: '0.01ms !important',
      animationIterationCount: '1 !important',
      // A short duration would make every change of every property of every element a transition.
      transition: 'none !important',
      scrollBehavior: 'auto !important',
    },
  },
});
