import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { SectionTitle, TextLink } from '../../ui';

const Root = chakra('section', {
  base: { display: 'flex', flexDirection: 'column', gap: '3', minW: '0' },
});
const Head = chakra('div', {
  base: {
    display: 'flex',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    gap: '4',
    '& a': { minH: 'office', display: 'inline-flex', alignItems: 'center' },
  },
});

/** A part of the Yard with the way to the whole list. */
export function Section({
  title,
  more,
  children,
}: {
  title: string;
  more?: { to: string; label: string };
  children: ReactNode;
}) {
  return (
    <Root>
      <Head>
        <SectionTitle>{title}</SectionTitle>
        {more && <TextLink to={more.to}>{more.label}</TextLink>}
      </Head>
      {children}
    </Root>
  );
}
