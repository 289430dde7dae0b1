import { chakra } from '@chakra-ui/react';

/**
 * The right-hand panel: what to do on top, which may scroll; the answers below, always in the same place. On a phone
 * the page itself scrolls and the answers stick to its lower edge, under the thumb.
 */
export const Panel = chakra('section', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    minHeight: '0',
    flex: '1',
    animation: 'arrive 160ms ease-out',
  },
});

export const PanelBody = chakra('div', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    gap: '3',
    flex: '1',
    minHeight: '0',
    overflowY: { base: 'visible', md: 'auto' },
    paddingX: { base: '4', md: '5' },
    paddingTop: '4',
    paddingBottom: '3',
  },
});

export const PanelAnswers = chakra('div', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    gap: 'touch',
    paddingX: { base: '4', md: '5' },
    paddingTop: '3',
    paddingBottom: '3',
    bg: 'bg.panel',
    borderTopWidth: '1px',
    borderColor: 'line',
    position: { base: 'sticky', md: 'static' },
    bottom: '0',
    zIndex: 'bar',
  },
});

/** What comes under the answers; on a phone it is scrolled to. */
export const PanelMore = chakra('div', {
  base: {
    display: 'flex',
    flexDirection: { base: 'column', md: 'row', lg: 'column' },
    gap: 'touch',
    paddingX: { base: '4', md: '5' },
    paddingBottom: '4',
    bg: 'bg.panel',
    '&& > *': { minWidth: '0', flex: { md: '1 1 0', lg: 'none' } },
  },
});

export const Eyebrow = chakra('p', { base: { fontSize: 'sm', color: 'fg.muted' } });

export const Where = chakra('p', {
  base: { fontSize: 'lg', color: 'fg.muted', lineHeight: '1.3' },
});

export const Ask = chakra('h2', { base: { fontSize: 'lg', fontWeight: 'semibold' } });

export const Small = chakra('p', { base: { fontSize: 'sm', color: 'fg.muted' } });

export const Text = chakra('p', { base: { fontSize: 'md', lineHeight: '1.35' } });

export const Stack = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', gap: 'touch' },
});

/** The answers to a question: one under the other, in portrait side by side, so that the drawing keeps its room. */
export const TwoAnswers = chakra('div', {
  base: {
    display: 'grid',
    gap: 'touch',
    gridTemplateColumns: { base: '1fr', md: '1fr 1fr', lg: '1fr' },
  },
});

/** Choices of equal width, two on a line. */
export const Pairs = chakra('div', {
  base: { display: 'grid', gridTemplateColumns: '1fr 1fr', gap: 'touch' },
});

export const Row = chakra('div', {
  base: { display: 'flex', flexWrap: 'wrap', gap: 'touch', '& > *': { flex: '1' } },
});
