import { createToaster } from '@chakra-ui/react';
import { errorSentence } from '../app/api-problem';

export const toaster = createToaster({
  placement: 'bottom',
  pauseOnPageIdle: true,
  offsets: { bottom: '5.5rem', top: '1rem', left: '1rem', right: '1rem' },
});

/** Tells that something is done; with `undo` it can be taken back for a while. */
export function toastDone(title: string, undo?: () => void): void {
  const action = undo && { label: 'Undo', onClick: undo };
  toaster.create({ title, type: 'info', duration: undo ? 10_000 : 5_000, closable: true, action });
}

/** Tells what did not work, and stays until it is closed. */
export function toastError(error: unknown): void {
  toaster.create({
    title: 'It did not work',
    description: errorSentence(error),
    type: 'error',
    duration: Infinity,
    closable: true,
  });
}
