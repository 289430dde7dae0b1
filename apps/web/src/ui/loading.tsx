import { chakra } from '@chakra-ui/react';
import { useTranslation } from 'react-i18next';
import { VisuallyHidden } from './visually-hidden';

const Bars = chakra('div', { base: { display: 'flex', flexDirection: 'column', gap: '3' } });
const Bar = chakra('div', {
  base: {
    h: '14',
    borderRadius: 'md',
    bg: 'bg.sunken',
    animation: 'breathe 1.4s ease-in-out infinite',
  },
});

/** Holds the place of rows that are on their way. */
export function Loading({ rows = 4 }: { rows?: number }) {
  const { t } = useTranslation();
  return (
    <Bars role="status" aria-busy="true">
      <VisuallyHidden>{t('loading')}</VisuallyHidden>
      {Array.from({ length: rows }, (_, row) => (
        <Bar key={row} opacity={1 - row * 0.16} aria-hidden />
      ))}
    </Bars>
  );
}
