import { chakra } from '@chakra-ui/react';
import { useEffect, useRef, type ReactNode } from 'react';

interface StepHeadingProps {
  /** Says which screen this is; focus moves here whenever it changes. */
  screen: string;
  children: ReactNode;
}

const Heading = chakra('h1', {
  base: {
    fontSize: { base: '1.625rem', md: '1.8125rem' },
    fontWeight: 'bold',
    lineHeight: '1.12',
    letterSpacing: '-0.012em',
  },
});

/** The one instruction. Focus goes to it on every new screen, so that a keyboard or a screen reader starts there. */
export function StepHeading({ screen, children }: StepHeadingProps) {
  const ref = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    ref.current?.focus({ preventScroll: true });
    // In landscape the panel scrolls, on a phone the page does.
    ref.current?.parentElement?.scrollTo?.({ top: 0 });
    window.scrollTo({ top: 0 });
  }, [screen]);
  return (
    <Heading ref={ref} tabIndex={-1}>
      {children}
    </Heading>
  );
}
