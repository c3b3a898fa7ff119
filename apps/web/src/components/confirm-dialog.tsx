import { Button, Dialog, Portal } from '@chakra-ui/react';
import { useState } from 'react';
import type { ReactElement, ReactNode } from 'react';
import { toastError } from './toaster';

interface ConfirmDialogProps {
  /** The button that asks. */
  trigger: ReactElement;
  title: string;
  children: ReactNode;
  /** What the confirming button says: the deed itself, 'Retire the chain'. */
  confirm: string;
  /** Rust-coloured: it can't be taken back. */
  final?: boolean;
  onConfirm: () => Promise<unknown>;
}

/** Asks before something that is hard to take back; what goes wrong is said, and the question stays. */
export function ConfirmDialog({ trigger, title, children, confirm, final, onConfirm }: ConfirmDialogProps) {
  const [open, setOpen] = useState(false);
  const [busy, setBusy] = useState(false);
  const act = async () => {
    setBusy(true);
    try {
      await onConfirm();
      setOpen(false);
    } catch (error) {
      toastError(error);
    } finally {
      setBusy(false);
    }
  };
  return (
    <Dialog.Root
      role="alertdialog"
      placement="center"
      lazyMount
      unmountOnExit
      open={open}
      onOpenChange={(to) => setOpen(to.open)}
    >
      <Dialog.Trigger asChild>{trigger}</Dialog.Trigger>
      <Portal>
        <Dialog.Backdrop />
        <Dialog.Positioner px="4">
          <Dialog.Content>
            <Dialog.Header>
              <Dialog.Title>{title}</Dialog.Title>
            </Dialog.Header>
            <Dialog.Body>{children}</Dialog.Body>
            <Dialog.Footer flexWrap="wrap">
              <Dialog.ActionTrigger asChild>
                <Button variant="outline">Leave it</Button>
              </Dialog.ActionTrigger>
              <Button colorPalette={final ? 'rust' : undefined} loading={busy} onClick={() => void act()}>
                {confirm}
              </Button>
            </Dialog.Footer>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}
