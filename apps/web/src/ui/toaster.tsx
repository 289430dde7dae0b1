import { chakra } from '@chakra-ui/react';
import { CircleCheck, TriangleAlert, X } from 'lucide-react';
import { useEffect, useSyncExternalStore } from 'react';
import { useTranslation } from 'react-i18next';
import { IconButton } from './button';
import { dismiss, toasts, type Toast } from './toast';

const Region = chakra('div', {
  base: {
    position: 'fixed',
    zIndex: 'toast',
    insetX: '0',
    bottom: { base: '84px', lg: '24px' },
    px: '4',
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'center',
    gap: '2',
    pointerEvents: 'none',
  },
});
const Card = chakra('div', {
  base: {
    pointerEvents: 'auto',
    display: 'flex',
    alignItems: 'center',
    gap: '3',
    maxW: '36rem',
    bg: 'ink.solid',
    color: 'ink.onSolid',
    borderRadius: 'md',
    pl: '4',
    pr: '1',
    py: '1',
    animation: 'arrive 160ms ease-out',
    '& button': { color: 'inherit', _hover: { bg: 'transparent' }, _active: { bg: 'transparent' } },
  },
});

function ToastCard({ toast }: { toast: Toast }) {
  const { t } = useTranslation();
  const Icon = toast.tone === 'failed' ? TriangleAlert : CircleCheck;
  useEffect(() => {
    // A failure stays until it is read.
    if (toast.tone === 'failed') return undefined;
    const timer = setTimeout(() => dismiss(toast.id), 6_000);
    return () => clearTimeout(timer);
  }, [toast]);
  return (
    <Card>
      <Icon size={20} aria-hidden />
      <span>{toast.words}</span>
      <IconButton size="office" icon={X} label={t('dismiss')} onClick={() => dismiss(toast.id)} />
    </Card>
  );
}

/** The live region in which short answers appear; it stays in the page so that readers know it. */
export function Toaster() {
  const shown = useSyncExternalStore(toasts.subscribe, toasts.get);
  return (
    <Region role="status" aria-live="polite">
      {shown.map((toast) => (
        <ToastCard key={toast.id} toast={toast} />
      ))}
    </Region>
  );
}
