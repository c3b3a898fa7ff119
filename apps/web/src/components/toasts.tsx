import { createToaster, Portal, Stack, Toast, Toaster } from '@chakra-ui/react';
import { X } from 'lucide-react';
import { MoreParts } from '../app/theme/more-provider';

/** On a phone they come at the head: at the foot they would lie on the button that comes next. */
const onPhone = window.matchMedia('(max-width: 47.9em)').matches;

export const toaster = createToaster({
  placement: onPhone ? 'top' : 'bottom',
  offsets: { bottom: '5.5rem', top: '1rem', left: '1rem', right: '1rem' },
});

/** The messages that tell what was done or did not work. */
export default function Toasts() {
  return (
    <MoreParts>
      <Portal>
        <Toaster toaster={toaster} insetInline={{ mdDown: '4' }}>
          {(toast) => (
            <Toast.Root width={{ md: 'sm' }}>
              <Stack gap="1" flex="1">
                <Toast.Title>{toast.title}</Toast.Title>
                {toast.description && <Toast.Description>{toast.description}</Toast.Description>}
              </Stack>
              {toast.action && <Toast.ActionTrigger>{toast.action.label}</Toast.ActionTrigger>}
              {toast.closable && (
                <Toast.CloseTrigger aria-label="Close the message">
                  <X size={18} aria-hidden="true" />
                </Toast.CloseTrigger>
              )}
            </Toast.Root>
          )}
        </Toaster>
      </Portal>
    </MoreParts>
  );
}
