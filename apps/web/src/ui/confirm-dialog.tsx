import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from './button';
import { Modal } from './modal';

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
    <Modal
      role="alertdialog"
      open={open}
      title={title}
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>{t('cancel')}</Button>
          <Button look={danger ? 'overload' : 'primary'} busy={busy} onClick={onConfirm}>
            {confirm}
          </Button>
        </>
      }
    >
      {children}
    </Modal>
  );
}
