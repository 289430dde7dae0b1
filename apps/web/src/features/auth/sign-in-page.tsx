import { chakra } from '@chakra-ui/react';
import { useTranslation } from 'react-i18next';
import { Navigate, useLocation } from 'react-router-dom';
import { paths } from '../../lib/paths';
import { useSession } from '../../lib/session-context';
import { Callout, PageTitle, Wordmark } from '../../ui';
import { DemoPeople } from './demo-people';
import { HarnessArt } from './harness-art';
import { SignInForm } from './sign-in-form';

const Frame = chakra('main', {
  base: {
    minH: '100dvh',
    display: 'grid',
    gridTemplateColumns: { base: '1fr', lg: 'minmax(0, 1.1fr) minmax(26rem, 0.9fr)' },
  },
});
const Cover = chakra('div', {
  base: {
    bg: 'bg.sunken',
    borderRight: { lg: '1px solid' },
    borderColor: { lg: 'line' },
    p: { base: '5', md: '8', lg: '12' },
    display: 'flex',
    flexDirection: 'column',
    justifyContent: 'space-between',
    gap: '7',
  },
});
const Motto = chakra('p', {
  base: {
    fontSize: { base: 'xl', md: '3xl', lg: '4xl' },
    fontWeight: 'bold',
    lineHeight: '1.08',
    letterSpacing: '-0.022em',
    maxW: '18ch',
    textWrap: 'balance',
  },
});
const Small = chakra('p', { base: { color: 'fg.muted', maxW: '34rem' } });
const Side = chakra('div', {
  base: {
    p: { base: '5', md: '8', lg: '12' },
    display: 'flex',
    flexDirection: 'column',
    justifyContent: 'center',
    gap: '6',
    w: 'full',
    maxW: '36rem',
    mx: 'auto',
  },
});

/** Where the person wanted to go; only an address of this program. */
function wanted(state: unknown): string {
  if (typeof state !== 'object' || state === null || !('from' in state)) return paths.yard();
  return typeof state.from === 'string' && /^\/(?!\/)/.test(state.from) ? state.from : paths.yard();
}

export function SignInPage() {
  const { t } = useTranslation(['auth', 'common']);
  const { session } = useSession();
  const { state } = useLocation();
  if (session.state === 'in') return <Navigate to={wanted(state)} replace />;
  return (
    <Frame>
      <Cover>
        <Wordmark />
        <div>
          <Motto>{t('common:tagline')}</Motto>
          <Small mt="4">{t('welcome')}</Small>
        </div>
        <HarnessArt />
        <Small>{t('advice')}</Small>
      </Cover>
      <Side>
        <PageTitle>{t('title')}</PageTitle>
        {session.state === 'out' && session.ended && <Callout role="status">{t('ended')}</Callout>}
        <SignInForm />
        <DemoPeople />
      </Side>
    </Frame>
  );
}
