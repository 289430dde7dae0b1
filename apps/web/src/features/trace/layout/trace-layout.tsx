import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/** Landscape: drawing left, panel right. Portrait: drawing above. Phone: a small drawing, then the panel at the thumb. */
const Frame = chakra('div', {
  base: {
    display: 'grid',
    minHeight: '100dvh',
    gridTemplateColumns: 'minmax(0, 1fr)',
    gridTemplateRows: 'auto auto 1fr auto',
    gridTemplateAreas: '"head" "plan" "panel" "past"',
    md: {
      height: '100dvh',
      gridTemplateRows: 'auto minmax(0, 1fr) minmax(0, auto) auto',
    },
    lg: {
      gridTemplateColumns: 'minmax(0, 1fr) 430px',
      gridTemplateRows: 'auto minmax(0, 1fr) auto',
      gridTemplateAreas: '"head head" "plan panel" "past panel"',
    },
  },
});

const Head = chakra('header', { base: { gridArea: 'head' } });
const Plan = chakra('div', {
  base: {
    gridArea: 'plan',
    minWidth: '0',
    minHeight: '0',
    display: 'flex',
    flexDirection: 'column',
  },
});
const Side = chakra('main', {
  base: {
    gridArea: 'panel',
    minWidth: '0',
    minHeight: '0',
    maxHeight: { md: '54dvh', lg: 'none' },
    display: 'flex',
    flexDirection: 'column',
    bg: 'bg.panel',
    borderTopWidth: { base: '1px', lg: '0' },
    borderInlineStartWidth: { lg: '1px' },
    borderColor: 'line',
  },
});
const Past = chakra('footer', { base: { gridArea: 'past', minWidth: '0' } });

interface TraceLayoutProps {
  head: ReactNode;
  plan: ReactNode;
  past: ReactNode;
  children: ReactNode;
}

export function TraceLayout({ head, plan, past, children }: TraceLayoutProps) {
  return (
    <Frame>
      <Head>{head}</Head>
      <Plan>{plan}</Plan>
      <Side>{children}</Side>
      <Past>{past}</Past>
    </Frame>
  );
}
