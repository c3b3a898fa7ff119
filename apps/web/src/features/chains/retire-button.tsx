import { Button, Stack, Text } from '@chakra-ui/react';
import type { Chain, RetiredReason } from '@halfpitch/contracts';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { ConfirmDialog } from '../../components/confirm-dialog';
import { Tiles } from '../../components/fields/tiles';
import { toastDone } from '../../components/toaster';
import { retireChain } from './api/retire-chain';
import { retiredWords } from './chain-words';
import { useChanged } from './follow-estimate';
import { optionsOf } from './options';

/** Takes the chain out of service, with the reason. */
export function RetireButton({ chain }: { chain: Chain }) {
  const { today } = useFormat();
  const changed = useChanged();
  const [because, setBecause] = useState<RetiredReason>('worn');
  return (
    <ConfirmDialog
      trigger={<Button variant="outline">Retire it</Button>}
      title={`Retire ${chain.label}?`}
      confirm="Retire the chain"
      onConfirm={async () => {
        await retireChain(chain.id, { day: today, because });
        changed(chain.id);
        toastDone(`${chain.label} is retired.`);
      }}
    >
      <Stack gap="4">
        <Text>It leaves the bike and the lists and gets no more reminders. Its history stays.</Text>
        <Tiles
          name="because"
          label="Why"
          options={optionsOf(retiredWords)}
          value={because}
          onChange={setBecause}
        />
      </Stack>
    </ConfirmDialog>
  );
}
