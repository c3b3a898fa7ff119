import { newChain } from '@halfpitch/contracts';
import type { Bike, Chain } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useSession } from '../../app/session';
import { Tiles } from '../../components/fields/tiles';
import { Form } from '../../components/form';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { bikesQuery } from '../bikes/api/bikes';
import { addChain } from './api/add-chain';
import { allChainsQuery } from './api/chains';
import { ChainFields } from './chain-fields';
import { useChanged } from './follow-estimate';
import { nextLabel } from './next-label';

const BOX = 'box';

function ChainForm({ bikes, chains, first }: { bikes: Bike[]; chains: Chain[]; first: Bike | undefined }) {
  const { workshop, riderId } = useSession();
  const [search] = useSearchParams();
  const [place, setPlace] = useState(first?.id ?? BOX);
  const navigate = useNavigate();
  const changed = useChanged();
  const owner = riderId ?? first?.riderId ?? search.get('rider') ?? undefined;
  const places = [
    ...bikes.map(({ id, name }) => ({ value: id, label: name })),
    { value: BOX, label: 'In the box' },
  ];
  return (
    <Form
      schema={newChain}
      defaultValues={{
        riderId: owner,
        bikeId: null,
        label: nextLabel(chains),
        speeds: first?.speeds ?? 11,
        regime: chains[0]?.regime ?? 'immersion-wax',
        wearLimitPct: null,
        inServiceOn: workshop.today,
      }}
      onSubmit={async (values) => {
        const chain = await addChain({ ...values, bikeId: place === BOX ? null : place });
        changed(chain.id);
        toastDone(`${chain.label} is added.`);
        await navigate(`/chains/${chain.id}`, { replace: true });
      }}
    >
      <Tiles
        name="place"
        label="Where it is"
        options={places}
        value={place}
        onChange={setPlace}
        minTileWidth="8rem"
      />
      <ChainFields />
      <SubmitButton alignSelf="flex-start">Add the chain</SubmitButton>
    </Form>
  );
}

/** A new chain, on the bike named in the address or in the box. */
export function NewChain() {
  const { riderId } = useSession();
  const [search] = useSearchParams();
  const of = riderId ?? search.get('rider') ?? undefined;
  const bikes = useQuery(bikesQuery({ riderId: of }));
  const first = bikes.data?.items.find(({ id }) => id === search.get('bike'));
  const owner = of ?? first?.riderId;
  const chains = useQuery(allChainsQuery({ riderId: owner }));
  return (
    <>
      <PageHeader title="Add a chain" lead="A chain that is on the bike now goes into the box." />
      <Loaded query={bikes}>
        {({ items }) => (
          <Loaded query={chains}>
            {(page) => (
              <ChainForm
                bikes={items.filter((bike) => bike.riderId === owner)}
                chains={page.items}
                first={first}
              />
            )}
          </Loaded>
        )}
      </Loaded>
    </>
  );
}
