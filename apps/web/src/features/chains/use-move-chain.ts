import type { Chain } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { useFormat } from '../../app/use-format';
import { toastDone, toastError } from '../../components/toaster';
import { boxChain } from './api/box-chain';
import { chainQuery } from './api/chain';
import { allChainsQuery } from './api/chains';
import { fitChain } from './api/fit-chain';
import { useChanged } from './follow-estimate';

interface NamedBike {
  id: string;
  name: string;
}

/** Moves chains between bike and box as of today, and back again when that was a slip. */
export function useMoveChain() {
  const { today } = useFormat();
  const client = useQueryClient();
  const changed = useChanged();
  const attempt = async (move: () => Promise<unknown>) => {
    try {
      await move();
    } catch (error) {
      toastError(error);
    }
  };
  const onBike = async (bikeId: string) => {
    const chains = await client.fetchQuery({ ...allChainsQuery({ bikeId }), staleTime: 0 });
    return chains.items.find((chain) => chain.bikeId === bikeId);
  };
  const fit = (chain: Chain, bike: NamedBike) =>
    attempt(async () => {
      const before = await onBike(bike.id);
      await fitChain(chain.id, { bikeId: bike.id, day: today });
      changed(chain.id);
      const undo = before
        ? () => fitChain(before.id, { bikeId: bike.id, day: today })
        : () => boxChain(chain.id, today);
      const told = before
        ? `${chain.label} is on ${bike.name}; ${before.label} is in the box.`
        : `${chain.label} is on ${bike.name}.`;
      toastDone(
        told,
        () =>
          void attempt(async () => {
            await undo();
            changed(chain.id);
          }),
      );
    });
  const box = (chain: Chain) =>
    attempt(async () => {
      const { bikeId } = await client.fetchQuery(chainQuery(chain.id));
      await boxChain(chain.id, today);
      changed(chain.id);
      toastDone(
        `${chain.label} is in the box.`,
        () =>
          void attempt(async () => {
            if (bikeId) await fitChain(chain.id, { bikeId, day: today });
            changed(chain.id);
          }),
      );
    });
  return { fit, box };
}
