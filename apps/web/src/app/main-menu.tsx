import { chakra } from '@chakra-ui/react';
import type { Permission } from '@lampwright/contracts';
import {
  type LucideIcon,
  CircleUserRound,
  Route,
  Truck,
  UsersRound,
  Warehouse,
  Waypoints,
} from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { NavLink } from 'react-router-dom';
import { paths } from '../lib/paths';
import { useAccount } from '../lib/session-context';

interface Entry {
  name: string;
  to: string;
  icon: LucideIcon;
}

const entries = [
  { name: 'yard', to: paths.yard(), icon: Warehouse, needs: 'account.use' },
  { name: 'traces', to: paths.traces(), icon: Route, needs: 'traces.readOwn' },
  { name: 'trailers', to: paths.trailers(), icon: Truck, needs: 'trailers.read' },
  { name: 'plans', to: paths.plans(), icon: Waypoints, needs: 'plans.publish' },
  { name: 'people', to: paths.people(), icon: UsersRound, needs: 'people.read' },
  { name: 'account', to: paths.account(), icon: CircleUserRound, needs: 'account.use' },
] as const satisfies readonly (Entry & { needs: Permission })[];

/** A row in the header, and a bar at the thumb on a phone. */
const Nav = chakra('nav', {
  base: {
    position: { base: 'fixed', md: 'static' },
    zIndex: 'bar',
    insetX: '0',
    bottom: '0',
    flex: '1',
    display: 'flex',
    justifyContent: { base: 'space-around', md: 'flex-end' },
    gap: { base: '0', md: '1.5' },
    bg: 'bg.panel',
    borderTop: { base: '1px solid', md: '0' },
    borderColor: 'line',
    pb: { base: 'env(safe-area-inset-bottom)', md: '0' },
    '& a': {
      display: 'flex',
      flexDirection: { base: 'column', md: 'row' },
      alignItems: 'center',
      justifyContent: 'center',
      gap: { base: '1', md: '2' },
      flex: { base: '1', md: '0 0 auto' },
      minW: '0',
      minH: { base: '68px', md: '64px' },
      px: { base: '0.5', md: '3' },
      fontSize: { base: '0.8125rem', md: 'md' },
      fontWeight: 'medium',
      color: 'fg.muted',
      borderBlock: '3px solid transparent',
      outlineOffset: '-4px',
    },
    '& a[aria-current=page]': {
      color: 'fg',
      fontWeight: 'bold',
      borderTopColor: { base: 'fg', md: 'transparent' },
      borderBottomColor: { base: 'transparent', md: 'fg' },
    },
    '& a svg': { display: { md: 'none', xl: 'block' } },
  },
});

export function MainMenu() {
  const { t } = useTranslation();
  const { permissions } = useAccount();
  return (
    <Nav aria-label={t('mainMenu')}>
      {entries
        .filter(({ needs }) => permissions.includes(needs))
        .map(({ name, to, icon: Icon }) => (
          <NavLink key={name} to={to} end={name === 'yard'}>
            <Icon size={24} aria-hidden />
            {t(`nav.${name}`)}
          </NavLink>
        ))}
    </Nav>
  );
}
