import { Switch, Text } from '@chakra-ui/react';
import type { Rider } from '@halfpitch/contracts';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Panel } from '../../components/panel';
import { toastDone, toastError } from '../../components/toaster';
import { switchReminders } from './api/switch-reminders';

/** Turns a rider's letters on or off, as the rider can too. */
export function RiderReminders({ rider }: { rider: Rider }) {
  const client = useQueryClient();
  const change = useMutation({
    mutationFn: (on: boolean) => switchReminders(rider.id, on),
    onSuccess: async (_, on) => {
      await client.invalidateQueries({ queryKey: ['riders'] });
      const said = on ? `${rider.name} is reminded again.` : `${rider.name} gets no more reminders.`;
      toastDone(said, () => change.mutate(!on));
    },
    onError: toastError,
  });
  return (
    <Panel title="Reminders">
      <Switch.Root
        checked={change.isPending ? change.variables : rider.remindersOn}
        disabled={change.isPending}
        onCheckedChange={({ checked }) => change.mutate(checked)}
      >
        <Switch.HiddenInput />
        <Switch.Control>
          <Switch.Thumb />
        </Switch.Control>
        <Switch.Label>Write when a chain falls due</Switch.Label>
      </Switch.Root>
      <Text mt="3" color="fg.muted">
        The rider can stop them too, by the link in each e-mail.
      </Text>
    </Panel>
  );
}
