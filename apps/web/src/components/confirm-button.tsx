import { Button } from '@chakra-ui/react';
import type { ButtonProps } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { ConfirmDialog } from './confirm-dialog';

interface ConfirmButtonProps extends Omit<ButtonProps, 'onClick' | 'title'> {
  /** The question, in full: "Remove the gravel bike?" */
  question: string;
  /** What will follow from it. */
  consequence: ReactNode;
  /** The button that does it, named by what it does. */
  confirmLabel: string;
  onConfirm: () => Promise<unknown>;
  /** It can't be taken back. */
  final?: boolean;
}

/** A button that asks before it acts. */
export function ConfirmButton(props: ConfirmButtonProps) {
  const { question, consequence, confirmLabel, onConfirm, final, ...button } = props;
  return (
    <ConfirmDialog
      trigger={<Button {...button} />}
      title={question}
      confirm={confirmLabel}
      final={final}
      onConfirm={onConfirm}
    >
      {consequence}
    </ConfirmDialog>
  );
}
