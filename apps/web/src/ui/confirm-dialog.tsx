import { Dialog, Portal } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from './button';

export interface ConfirmDialogProps {
  open: boolean;
  title: string;
  children?: ReactNode;
  /** The verb of what will be done. */
  confirm: string;
  danger?: boolean;
  busy?: boolean;
  onConfirm: () => void;
  onClose: () => void;
}

/** Asks before something that cannot be taken back. What can be undone is not asked about. */
export function ConfirmDialog({
  open,
  title,
  children,
  confirm,
  danger = false,
  busy = false,
  onConfirm,
  onClose,
}: ConfirmDialogProps) {
  const { t } = useTranslation();
  return (
    <Dialog.Root
      role="alertdialog"
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
            <Dialog.Footer>
              <Button onClick={onClose}>{t('cancel')}</Button>
              <Button look={danger ? 'overload' : 'primary'} busy={busy} onClick={onConfirm}>
                {confirm}
              </Button>
            </Dialog.Footer>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}
