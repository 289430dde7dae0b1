import { chakra } from '@chakra-ui/react';
import { ArrowRight } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths';
import { useMay } from '../../lib/session-context';
import { Callout } from '../../ui';

const Start = chakra(Link, {
  base: {
    position: 'relative',
    overflow: 'hidden',
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '5',
    bg: 'ink.solid',
    color: 'ink.onSolid',
    borderRadius: 'lg',
    pl: { base: '5', md: '7' },
    pr: { base: '5', md: '7' },
    py: { base: '5', md: '7' },
    minH: '8.5rem',
    _active: { bg: 'ink.pressed' },
    '& svg': { flexShrink: '0' },
    '& strong': {
      display: 'block',
      fontSize: { base: '2xl', md: '3xl' },
      lineHeight: '1.1',
      letterSpacing: '-0.015em',
      mb: '1.5',
    },
    // The cut: the one amber line across what comes next.
    _before: {
      content: '""',
      position: 'absolute',
      insetY: '0',
      left: '0',
      w: '7px',
      bgImage:
        'repeating-linear-gradient(180deg, var(--chakra-colors-amber-mark) 0 16px, transparent 16px 24px)',
    },
  },
});

/** The big way into a trace, for those who may run one. */
export function StartPanel() {
  const { t } = useTranslation('yard');
  if (!useMay('traces.run'))
    return <Callout title={t('traineeTitle')}>{t('traineeWords')}</Callout>;
  return (
    <Start to={paths.newTrace()}>
      <span>
        <strong>{t('startTitle')}</strong>
        {t('startWords')}
      </span>
      <ArrowRight size={40} aria-hidden />
    </Start>
  );
}
