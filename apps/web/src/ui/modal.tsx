import { chakra } from '@chakra-ui/react';
import { useEffect, useId, useRef, type ReactNode } from 'react';

const Sheet = chakra('dialog', {
  base: {
    m: 'auto',
    mb: { base: '3', md: 'auto' },
    w: 'calc(100% - 24px)',
    maxW: '34rem',
    maxH: 'calc(100dvh - 24px)',
    overflow: 'auto',
    bg: 'bg.panel',
    color: 'fg',
    border: '1.5px solid',
    borderColor: 'edge',
    borderRadius: 'lg',
    p: { base: '5', md: '6' },
    _backdrop: { bg: 'rgb(13 22 29 / 0.6)' },
  },
});
const Stack = chakra('div', { base: { display: 'flex', flexDirection: 'column', gap: '4' } });
const Title = chakra('h2', { base: { fontSize: 'xl', fontWeight: 'bold', lineHeight: '1.2' } });
const Footer = chakra('div', {
  base: {
    display: 'flex',
    flexWrap: 'wrap-reverse',
    justifyContent: 'flex-end',
    gap: 'touch',
    pt: '2',
  },
});

export interface ModalProps {
  open: boolean;
  title: string;
  children?: ReactNode;
  /** The buttons; the first is the way out. */
  footer: ReactNode;
  role?: 'dialog' | 'alertdialog';
  onClose: () => void;
}

/** A sheet over the screen: the browser's own modal, which holds the focus and gives it back when it closes. */
export function Modal({ open, title, children, footer, role = 'dialog', onClose }: ModalProps) {
  const sheet = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = sheet.current;
    if (!open || !dialog) return undefined;
    dialog.showModal();
    return () => dialog.close();
  }, [open]);
  if (!open) return null;
  return (
    <Sheet
      ref={sheet}
      role={role}
      aria-labelledby={titleId}
      onCancel={(event) => {
        // Whether it is open is decided above; the Escape key only asks.
        event.preventDefault();
        onClose();
      }}
    >
      <Stack>
        <Title id={titleId}>{title}</Title>
        {children}
        <Footer>{footer}</Footer>
      </Stack>
    </Sheet>
  );
}
