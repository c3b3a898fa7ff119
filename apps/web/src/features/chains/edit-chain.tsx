import { chainInput } from '@halfpitch/contracts';
import type { Chain } from '@halfpitch/contracts';
import { Button, Separator, Stack } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { ConfirmDialog } from '../../components/confirm-dialog';
import { Form } from '../../components/form';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { chainQuery } from './api/chain';
import { changeChain } from './api/change-chain';
import { removeChain } from './api/remove-chain';
import { ChainFields } from './chain-fields';
import { useChanged } from './follow-estimate';

function EditForm({ chain }: { chain: Chain }) {
  const navigate = useNavigate();
  const changed = useChanged();
  return (
    <Stack gap="8" separator={<Separator />}>
      <Form
        schema={chainInput}
        defaultValues={chain}
        onSubmit={async (values) => {
          await changeChain(chain.id, values);
          changed(chain.id);
          toastDone('Saved.');
          await navigate(`/chains/${chain.id}`, { replace: true });
        }}
      >
        <ChainFields />
        <SubmitButton alignSelf="flex-start">Save</SubmitButton>
      </Form>
      <ConfirmDialog
        trigger={
          <Button variant="outline" alignSelf="flex-start">
            Remove this chain
          </Button>
        }
        title={`Remove ${chain.label}?`}
        confirm="Remove the chain"
        final
        onConfirm={async () => {
          await removeChain(chain.id);
          await navigate('/', { replace: true });
          changed(null);
          toastDone(`${chain.label} is removed.`);
        }}
      >
        It goes for good with its readings and treatments. A chain that is worn out is better retired: its
        history then stays.
      </ConfirmDialog>
    </Stack>
  );
}

export function EditChain() {
  const { id = '' } = useParams();
  const chain = useQuery(chainQuery(id));
  return (
    <>
      <PageHeader title="Edit the chain" lead={chain.data?.label} />
      <Loaded query={chain}>{(found) => <EditForm chain={found} />}</Loaded>
    </>
  );
}
