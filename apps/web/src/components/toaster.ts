import type { CreateToasterReturn } from '@chakra-ui/react';
import { errorSentence } from '../app/api-problem';

type Message = Parameters<CreateToasterReturn['create']>[0];

let wanted = false;
const listeners = new Set<() => void>();

/** Whether a message was ever raised: until then the code that shows them is not fetched. */
export const toastsWanted = {
  subscribe: (listener: () => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  read: () => wanted,
};

function raise(message: Message): void {
  wanted = true;
  listeners.forEach((listener) => listener());
  void import('./toasts').then(({ toaster }) => toaster.create(message));
}

/** Tells that something is done; with `undo` it can be taken back for a while. */
export function toastDone(title: string, undo?: () => void): void {
  const action = undo && { label: 'Undo', onClick: undo };
  raise({ title, type: 'info', duration: undo ? 10_000 : 5_000, closable: true, action });
}

/** Tells what did not work, and stays until it is closed. */
export function toastError(error: unknown): void {
  raise({
    title: 'It did not work',
    description: errorSentence(error),
    type: 'error',
    duration: Infinity,
    closable: true,
  });
}
