import { chakra } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

const Heading = chakra('h1', {
  base: { fontSize: { base: '2xl', md: '3xl' }, fontWeight: 'bold' },
});

/**
 * The heading of a screen, which also names the browser's tab. After a move inside the program it takes the focus, so
 * that a reader starts with it; the first page that is opened leaves the focus alone.
 */
export function PageTitle({ children, ...rest }: { children: string; fontSize?: string }) {
  const heading = useRef<HTMLHeadingElement>(null);
  const { key } = useLocation();
  useEffect(() => {
    if (key !== 'default') heading.current?.focus({ preventScroll: true });
  }, [key]);
  return (
    <>
      <title>{`${children} · Lampwright`}</title>
      <Heading ref={heading} tabIndex={-1} {...rest}>
        {children}
      </Heading>
    </>
  );
}
