import { Button, Dialog, Portal } from '@chakra-ui/react';
import type { ButtonProps } from '@chakra-ui/react';
import { useState } from 'react';
import type { ReactNode } from 'react';
import { toastError } from './toaster';

interface ConfirmButtonProps extends Omit<ButtonProps, 'onClick' | 'title'> {
  /** The question, in full: "Remove Ada Marsh?" */
  question: string;
  /** What will follow from it. */
  consequence: ReactNode;
  /** The button that does it, named by what it does. */
  confirmLabel: string;
  onConfirm: () => Promise<unknown>;
  /** It can't be taken back. */
  final?: boolean;
}

/** A button that asks before it acts, and stays asking when it did not work. */
export function ConfirmButton(props: ConfirmButtonProps) {
  const { question, consequence, confirmLabel, onConfirm, final = false, ...button } = props;
  const [open, setOpen] = useState(false);
  const [busy, setBusy] = useState(false);
  const confirm = async () => {
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
      open={open}
      onOpenChange={(change) => setOpen(change.open)}
    >
      <Dialog.Trigger asChild>
        <Button {...button} />
      </Dialog.Trigger>
      <Portal>
        <Dialog.Backdrop />
        <Dialog.Positioner>
          <Dialog.Content mx="4" bg="bg.panel">
            <Dialog.Header>
              <Dialog.Title>{question}</Dialog.Title>
            </Dialog.Header>
            <Dialog.Body>{consequence}</Dialog.Body>
            <Dialog.Footer>
              <Dialog.ActionTrigger asChild>
                <Button variant="outline">Leave it as it is</Button>
              </Dialog.ActionTrigger>
              <Button colorPalette={final ? 'rust' : undefined} loading={busy} onClick={() => void confirm()}>
                {confirmLabel}
              </Button>
            </Dialog.Footer>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}
