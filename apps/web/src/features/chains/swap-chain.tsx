import { Button, Menu, Portal, Stack, Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { Repeat2 } from 'lucide-react';
import { percent } from '../../app/format';
import { drynessOf, drynessWords } from '../../components/drawings/dryness';
import { useMoveChain } from './use-move-chain';

interface SwapChainProps {
  bikeId: string;
  bikeName: string;
  /** Chains in the box that fit this bike. */
  spare: readonly Chain[];
}

const stateWords = ({ state }: Chain) =>
  state
    ? `${drynessWords[drynessOf(state.shareUsed)]}, ${percent(state.shareUsed)} used`
    : 'not estimated yet';

/** Puts a chain from the box on the bike; the one that was on it goes into the box. */
export function SwapChain({ bikeId, bikeName, spare }: SwapChainProps) {
  const { fit } = useMoveChain();
  if (spare.length === 0) return null;
  return (
    <Menu.Root>
      <Menu.Trigger asChild>
        <Button variant="outline">
          <Repeat2 size={20} aria-hidden="true" /> Swap chain
        </Button>
      </Menu.Trigger>
      <Portal>
        <Menu.Positioner>
          <Menu.Content>
            {spare.map((chain) => (
              <Menu.Item
                key={chain.id}
                value={chain.id}
                onClick={() => void fit(chain, { id: bikeId, name: bikeName })}
              >
                <Stack gap="0">
                  <span>{chain.label}</span>
                  <Text as="span" color="fg.muted" textStyle="sm">
                    {stateWords(chain)}
                  </Text>
                </Stack>
              </Menu.Item>
            ))}
          </Menu.Content>
        </Menu.Positioner>
      </Portal>
    </Menu.Root>
  );
}
