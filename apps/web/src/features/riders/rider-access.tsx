import { Button, Text } from '@chakra-ui/react';
import type { Rider } from '@halfpitch/contracts';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Panel } from '../../components/panel';
import { toastDone, toastError } from '../../components/toaster';
import { inviteRider } from './api/invite-rider';

const states: Record<Rider['access'], string> = {
  none: 'Not invited yet: the rider can’t sign in. Reminders go out all the same.',
  invited: 'Invited, not joined yet.',
  joined: 'Has joined and can log rides.',
};

/** Invites the rider to sign in, or writes the invitation again. */
export function RiderAccess({ rider }: { rider: Rider }) {
  const client = useQueryClient();
  const invite = useMutation({
    mutationFn: () => inviteRider(rider.id),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: ['riders'] });
      toastDone(`An invitation is on its way to ${rider.email}.`);
    },
    onError: toastError,
  });
  return (
    <Panel title="Sign-in">
      <Text>{states[rider.access]}</Text>
      {rider.access !== 'joined' && (
        <Button mt="4" variant="outline" loading={invite.isPending} onClick={() => invite.mutate()}>
          {rider.access === 'none' ? 'Invite' : 'Write the invitation again'}
        </Button>
      )}
    </Panel>
  );
}
