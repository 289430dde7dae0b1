import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../../lib/paths';
import { useTraceContext } from '../store/trace-session';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';
import { MinutesSoFar } from './minutes-so-far';

const Bar = chakra('div', {
  base: {
    display: 'flex',
    alignItems: 'center',
    gap: { base: '3', md: '4' },
    minHeight: '60px',
    paddingX: { base: '3', md: '5' },
    bg: 'bg.panel',
    borderBottomWidth: '1px',
    borderColor: 'line',
  },
});
const Home = chakra(Link, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    minHeight: 'field',
    minWidth: 'field',
    fontSize: 'lg',
    fontWeight: 'bold',
    textDecoration: 'underline',
    textDecorationColor: 'line',
    textUnderlineOffset: '4px',
  },
});
const Unit = chakra('span', { base: { fontWeight: 'semibold', whiteSpace: 'nowrap' } });
const About = chakra('span', {
  base: {
    display: { base: 'none', md: 'block' },
    color: 'fg.muted',
    overflow: 'hidden',
    textOverflow: 'ellipsis',
    whiteSpace: 'nowrap',
    minWidth: '0',
  },
});
const Space = chakra('span', { base: { flex: '1' } });

/** Which trailer, which circuit, how long so far, and whether everything has reached the server. */
export function HeaderStrip({ children }: { children?: ReactNode }) {
  const t = useTraceWords();
  const names = useNames();
  const trailer = useTraceContext((context) => context.record.trailer);
  const circuit = useTraceContext((context) => context.circuit);
  const about = [t(`common:body.${trailer.bodyType}`), circuit && names.circuitWithPin(circuit)];
  return (
    <Bar>
      <Home to={paths.yard()}>{t('page.leave')}</Home>
      <Unit>{t('page.unit', { unit: trailer.unit })}</Unit>
      <About>{about.filter(Boolean).join(' · ')}</About>
      <Space />
      <MinutesSoFar />
      {children}
    </Bar>
  );
}
