import { Button, Stack, Text } from '@chakra-ui/react';
import type { Bike } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Pencil, PenLine, Plus } from 'lucide-react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { useSession } from '../../app/session';
import { ConfirmDialog } from '../../components/confirm-dialog';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { Panel } from '../../components/panel';
import { toastDone } from '../../components/toaster';
import { bikeKindWords, brakeFluidWords } from '../../components/trade-words';
import { allChainsQuery } from '../chains/api/chains';
import { ChainGlance } from '../chains/chain-glance';
import { speedWords } from '../chains/chain-words';
import { useChanged } from '../chains/follow-estimate';
import { SwapChain } from '../chains/swap-chain';
import { PlansPanel } from '../plans/plans-panel';
import { RideList } from '../rides/ride-list';
import { bikeQuery } from './api/bike';
import { removeBike } from './api/remove-bike';
import { OdometerPanel } from './odometer-panel';

function FittedChain({ bike }: { bike: Bike }) {
  const chains = useQuery(allChainsQuery({ riderId: bike.riderId }));
  return (
    <Panel title="Chain">
      <Loaded query={chains} rows={1} height="14rem">
        {({ items }) => {
          const fitted = items.find(({ id }) => id === bike.fittedChainId);
          const spare = items.filter(({ bikeId, speeds }) => bikeId === null && speeds === bike.speeds);
          return (
            <Stack gap="5" align="flex-start">
              {fitted ? (
                <ChainGlance chain={fitted} />
              ) : (
                <Text color="fg.muted">No chain is on this bike.</Text>
              )}
              <Stack direction="row" wrap="wrap" gap="3">
                <SwapChain bikeId={bike.id} bikeName={bike.name} spare={spare} />
                <Button asChild variant="outline">
                  <Link to={`/chains/new?bike=${bike.id}`}>
                    <Plus size={20} aria-hidden="true" /> New chain
                  </Link>
                </Button>
              </Stack>
            </Stack>
          );
        }}
      </Loaded>
    </Panel>
  );
}

function RemoveBike({ bike }: { bike: Bike }) {
  const navigate = useNavigate();
  const changed = useChanged();
  return (
    <ConfirmDialog
      trigger={
        <Button variant="outline" alignSelf="flex-start">
          Remove this bike
        </Button>
      }
      title={`Remove ${bike.name}?`}
      confirm="Remove the bike"
      final
      onConfirm={async () => {
        await removeBike(bike.id);
        changed(null);
        toastDone(`${bike.name} is removed.`);
        await navigate('/', { replace: true });
      }}
    >
      It goes from the lists with its rides and odometer readings. Its chains stay, in the box.
    </ConfirmDialog>
  );
}

function BikeView({ bike }: { bike: Bike }) {
  const { riderId } = useSession();
  const facts = [
    riderId === null && bike.riderName,
    bikeKindWords[bike.kind],
    speedWords(bike.speeds),
    bike.brakeFluid !== 'none' && `brakes: ${brakeFluidWords[bike.brakeFluid]}`,
  ];
  return (
    <>
      <PageHeader
        title={bike.name}
        lead={facts.filter(Boolean).join(' · ')}
        actions={
          <>
            <Button asChild>
              <Link to={`/log?bike=${bike.id}`}>
                <PenLine size={20} aria-hidden="true" /> Log a ride
              </Link>
            </Button>
            <Button asChild variant="outline">
              <Link to="edit">
                <Pencil size={20} aria-hidden="true" /> Edit
              </Link>
            </Button>
          </>
        }
      />
      <Stack gap="6">
        {bike.notes && <Text whiteSpace="pre-line">{bike.notes}</Text>}
        <FittedChain bike={bike} />
        <PlansPanel bikeId={bike.id} />
        <OdometerPanel bikeId={bike.id} chainId={bike.fittedChainId} />
        <Panel title="Rides">
          <RideList filter={{ bikeId: bike.id }} />
        </Panel>
        <RemoveBike bike={bike} />
      </Stack>
    </>
  );
}

export function BikePage() {
  const { id = '' } = useParams();
  const bike = useQuery(bikeQuery(id));
  return <Loaded query={bike}>{(data) => <BikeView bike={data} />}</Loaded>;
}
