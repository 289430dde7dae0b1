import { Dialog, Portal } from '@chakra-ui/react';
import type { ReactNode } from 'react';

export interface ModalProps {
  open: boolean;
  title: string;
  children?: ReactNode;
  /** The buttons; the first is the way out. */
  footer: ReactNode;
  role?: 'dialog' | 'alertdialog';
  onClose: () => void;
}

/** A sheet over the screen that holds the focus until it is closed. */
export function Modal({ open, title, children, footer, role = 'dialog', onClose }: ModalProps) {
  return (
    <Dialog.Root
      role={role}
      open={open}
      lazyMount
      unmountOnExit
      onOpenChange={(change) => {
        if (!change.open) onClose();
      }}
    >
      <Portal>
        <Dialog.Backdrop />
        <Dialog.Positioner>
          <Dialog.Content>
            <Dialog.Title>{title}</Dialog.Title>
            {children && <Dialog.Body>{children}</Dialog.Body>}
            <Dialog.Footer>{footer}</Dialog.Footer>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}
