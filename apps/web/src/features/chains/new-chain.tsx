import { newChain } from '@halfpitch/contracts';
import type { Bike, Chain } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { useSession } from '../../app/session';
import { EmptyState } from '../../components/empty-state';
import { Form } from '../../components/form';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { useWhoseBikes } from '../bikes/use-whose-bikes';
import { addChain } from './api/add-chain';
import { allChainsQuery } from './api/chains';
import { ChainFields } from './chain-fields';
import { useChanged } from './follow-estimate';
import { nextLabel } from './next-label';
import { PlaceTiles } from './place-tiles';

/** The bike that is named, or the only one. */
const firstOf = (bikes: readonly Bike[], wanted: string | null) =>
  bikes.find(({ id }) => id === wanted) ?? (bikes.length === 1 ? bikes[0] : undefined);

interface ChainFormProps {
  riderId: string | undefined;
  bikes: Bike[];
  /** Those there are, for the next label and the lubricant. */
  chains: Chain[];
  /** The bike it goes on. */
  first: Bike | undefined;
}

function ChainForm({ riderId, bikes, chains, first }: ChainFormProps) {
  const { workshop } = useSession();
  const navigate = useNavigate();
  const changed = useChanged();
  return (
    <Form
      schema={newChain}
      defaultValues={{
        riderId,
        bikeId: first?.id ?? null,
        label: nextLabel(chains),
        speeds: first?.speeds ?? 11,
        regime: chains[0]?.regime ?? 'immersion-wax',
        wearLimitPct: null,
        inServiceOn: workshop.today,
      }}
      onSubmit={async (values) => {
        const chain = await addChain(values);
        changed(chain.id);
        toastDone(`${chain.label} is added.`);
        await navigate(`/chains/${chain.id}`, { replace: true });
      }}
    >
      <PlaceTiles bikes={bikes} />
      <ChainFields />
      <SubmitButton alignSelf="flex-start">Add the chain</SubmitButton>
    </Form>
  );
}

/** A new chain, on the bike named in the address or in the box. */
export function NewChain() {
  const { bikeId, riderId, bikes, isNamed } = useWhoseBikes();
  const chains = useQuery({ ...allChainsQuery({ riderId }), enabled: riderId !== undefined });
  if (!isNamed)
    return (
      <EmptyState title="Whose chain is it?">Open the rider first and add the chain from there.</EmptyState>
    );
  return (
    <>
      <PageHeader title="Add a chain" lead="A chain that is on the bike now goes into the box." />
      <Loaded query={bikes}>
        {({ items }) => (
          <Loaded query={chains}>
            {(page) => (
              <ChainForm riderId={riderId} bikes={items} chains={page.items} first={firstOf(items, bikeId)} />
            )}
          </Loaded>
        )}
      </Loaded>
    </>
  );
}
