import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { PageTitle } from './page-title';

const Root = chakra('div', {
  base: {
    w: 'full',
    mx: 'auto',
    px: { base: '4', md: '7' },
    py: { base: '5', md: '7' },
    display: 'flex',
    flexDirection: 'column',
    gap: '6',
  },
  variants: { width: { wide: { maxW: '80rem' }, reading: { maxW: '46rem' } } },
  defaultVariants: { width: 'wide' },
});

/** The frame of a screen. */
export function Page({
  width = 'wide',
  children,
}: {
  width?: 'wide' | 'reading';
  children: ReactNode;
}) {
  return <Root width={width}>{children}</Root>;
}

const Head = chakra('header', {
  base: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '4',
    columnGap: '6',
  },
});
const Back = chakra(Link, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    minH: 'office',
    color: 'fg.muted',
    fontWeight: 'medium',
    textDecoration: 'underline',
    textUnderlineOffset: '3px',
    textDecorationColor: 'line',
  },
});
const Lead = chakra('p', { base: { color: 'fg.muted', fontSize: 'lg', mt: '1.5', maxW: '44rem' } });
const Actions = chakra('div', { base: { display: 'flex', flexWrap: 'wrap', gap: 'touch' } });

export interface PageHeaderProps {
  title: string;
  lead?: ReactNode;
  /** Where this screen was reached from. */
  back?: { to: string; label: string };
  actions?: ReactNode;
}

export function PageHeader({ title, lead, back, actions }: PageHeaderProps) {
  return (
    <Head>
      <div>
        {back && <Back to={back.to}>{back.label}</Back>}
        <PageTitle>{title}</PageTitle>
        {lead && <Lead>{lead}</Lead>}
      </div>
      {actions && <Actions>{actions}</Actions>}
    </Head>
  );
}
