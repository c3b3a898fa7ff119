import { Button, Flex, Link, Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { useFormat } from '../../app/use-format';
import { Panel } from '../../components/panel';
import { toastDone, toastError } from '../../components/toaster';
import { bikesQuery } from '../bikes/api/bikes';
import { returnChain } from './api/return-chain';
import { retiredWords } from './chain-words';
import { useChanged } from './follow-estimate';
import { RetireButton } from './retire-button';
import { useMoveChain } from './use-move-chain';

function Retired({ chain }: { chain: Chain }) {
  const { day } = useFormat();
  const changed = useChanged();
  const takeBack = async () => {
    try {
      await returnChain(chain.id);
      changed(chain.id);
      toastDone(`${chain.label} is in service again, in the box.`);
    } catch (error) {
      toastError(error);
    }
  };
  return (
    <>
      <Text mb="4">
        Retired{chain.retiredOn && ` on ${day(chain.retiredOn)}`}
        {chain.retiredBecause && `: ${retiredWords[chain.retiredBecause].toLowerCase()}`}.
      </Text>
      <Button variant="outline" onClick={() => void takeBack()}>
        Take it back into service
      </Button>
    </>
  );
}

/** Where the chain is, and the ways to move it. */
export function RotationPanel({ chain }: { chain: Chain }) {
  const bikes = useQuery(bikesQuery({ riderId: chain.riderId }));
  const { fit, box } = useMoveChain();
  if (chain.retiredOn)
    return (
      <Panel title="Where it is">
        <Retired chain={chain} />
      </Panel>
    );
  const fits =
    bikes.data?.items.filter(({ id, speeds }) => id !== chain.bikeId && speeds === chain.speeds) ?? [];
  return (
    <Panel title="Where it is">
      <Text mb="4">
        {chain.bikeId ? (
          <>
            On{' '}
            <Link asChild>
              <RouterLink to={`/bikes/${chain.bikeId}`}>{chain.bikeName}</RouterLink>
            </Link>
            .
          </>
        ) : (
          'In the box.'
        )}
      </Text>
      <Flex gap="3" wrap="wrap">
        {fits.map((bike) => (
          <Button key={bike.id} variant="outline" onClick={() => void fit(chain, bike)}>
            Put it on {bike.name}
          </Button>
        ))}
        {chain.bikeId && (
          <Button variant="outline" onClick={() => void box(chain)}>
            Put it in the box
          </Button>
        )}
        <RetireButton chain={chain} />
      </Flex>
    </Panel>
  );
}
