import { Button } from '@chakra-ui/react';
import type { Rider } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { ConfirmDialog } from '../../components/confirm-dialog';
import { toastDone } from '../../components/toaster';
import { removeRider } from './api/rider';

const counted = (n: number, one: string, many: string) => `${n} ${n === 1 ? one : many}`;

/** Removes a rider and all that hangs on them, after asking. */
export function RemoveRider({ rider }: { rider: Rider }) {
  const client = useQueryClient();
  const navigate = useNavigate();
  const bikes = counted(rider.bikes, 'bike', 'bikes');
  const chains = counted(rider.chains, 'chain', 'chains');
  return (
    <ConfirmDialog
      trigger={
        <Button variant="outline" colorPalette="rust" alignSelf="flex-start">
          Remove this rider
        </Button>
      }
      title={`Remove ${rider.name}?`}
      confirm="Remove for good"
      final
      onConfirm={async () => {
        await removeRider(rider.id);
        await navigate('/riders', { replace: true });
        for (const key of ['riders', 'bikes', 'chains', 'reminders'])
          void client.invalidateQueries({ queryKey: [key] });
        toastDone(`${rider.name} is removed.`);
      }}
    >
      {bikes} and {chains} go too, with every ride, reading and treatment. This can’t be taken back.
    </ConfirmDialog>
  );
}
