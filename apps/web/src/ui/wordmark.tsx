import { chakra } from '@chakra-ui/react';
import { useTranslation } from 'react-i18next';

const Root = chakra('span', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '2.5',
    fontWeight: 'bold',
    fontSize: 'xl',
    letterSpacing: '-0.02em',
    color: 'fg',
    '& svg': { flexShrink: '0' },
  },
});

/** Two lamps on one harness, and the cut between them. */
function Mark({ size = 34 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="1 2 30 28" fill="none" aria-hidden="true">
      <path
        d="M3 20h9.5M19.5 20H29"
        stroke="currentColor"
        strokeWidth="3.2"
        strokeLinecap="round"
      />
      <path
        d="M8.5 20v-7M23.5 20v-7"
        stroke="currentColor"
        strokeWidth="2.6"
        strokeLinecap="round"
      />
      <circle cx="8.5" cy="10.2" r="3.4" fill="currentColor" />
      <circle cx="23.5" cy="10.2" r="3.4" fill="var(--chakra-colors-amber-mark)" />
      <path
        d="M16 4v24"
        stroke="var(--chakra-colors-amber-mark)"
        strokeWidth="2.8"
        strokeDasharray="5 3"
      />
    </svg>
  );
}

export function Wordmark({ size }: { size?: number }) {
  const { t } = useTranslation();
  return (
    <Root>
      <Mark {...(size ? { size } : {})} />
      {t('product')}
    </Root>
  );
}
