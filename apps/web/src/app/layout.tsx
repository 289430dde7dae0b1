import { chakra } from '@chakra-ui/react';
import { CloudOff } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link, Outlet, ScrollRestoration } from 'react-router-dom';
import { paths } from '../lib/paths';
import { useReachable } from '../lib/reachability';
import { Wordmark } from '../ui';
import { MainMenu } from './main-menu';

const Frame = chakra('div', {
  base: {
    minH: '100dvh',
    display: 'flex',
    flexDirection: 'column',
    pb: { base: 'calc(76px + env(safe-area-inset-bottom))', md: '0' },
  },
});
const Bar = chakra('header', {
  base: {
    bg: 'bg.panel',
    borderBottom: '1px solid',
    borderColor: 'line',
    display: 'flex',
    alignItems: 'center',
    gap: '6',
    minH: '64px',
    px: { base: '4', md: '7' },
    position: { md: 'sticky' },
    top: '0',
    zIndex: 'bar',
  },
});
const Home = chakra(Link, { base: { display: 'flex', alignItems: 'center', minH: 'field' } });
const Skip = chakra('a', {
  base: {
    position: 'absolute',
    left: '-999px',
    top: '2',
    bg: 'ink.solid',
    color: 'ink.onSolid',
    px: '5',
    minH: 'office',
    display: 'flex',
    alignItems: 'center',
    borderRadius: 'md',
    zIndex: 'toast',
    _focus: { left: '2' },
  },
});
const Offline = chakra('p', {
  base: {
    display: 'flex',
    alignItems: 'center',
    gap: '2.5',
    px: { base: '4', md: '7' },
    py: '2.5',
    bg: 'slate.wash',
    color: 'slate.fg',
    fontWeight: 'medium',
  },
});
const Main = chakra('main', { base: { flex: '1', minW: '0', _focusVisible: { outline: 'none' } } });

/** The frame of every screen but the trace and the sign-in. */
export function Layout() {
  const { t } = useTranslation();
  const reachable = useReachable();
  return (
    <Frame>
      <Skip href="#content">{t('skipToContent')}</Skip>
      <Bar>
        <Home to={paths.yard()}>
          <Wordmark />
        </Home>
        <MainMenu />
      </Bar>
      <div role="status">
        {!reachable && (
          <Offline>
            <CloudOff size={20} aria-hidden />
            {t('unreachable')}
          </Offline>
        )}
      </div>
      <Main id="content" tabIndex={-1}>
        <Outlet />
      </Main>
      <ScrollRestoration />
    </Frame>
  );
}
