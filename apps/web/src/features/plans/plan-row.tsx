import { Box, Flex, IconButton, Link, Text } from '@chakra-ui/react';
import type { Plan } from '@halfpitch/contracts';
import { Trash2 } from 'lucide-react';
import { Link as RouterLink } from 'react-router-dom';
import { spanWords } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { toastDone, toastError } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { addPlan } from './api/add-plan';
import { removePlan } from './api/remove-plan';
import { adviceWords, outlookWords } from './outlook-words';

/** One plan: when, how far, and whether the chain will last through it. */
export function PlanRow({ plan }: { plan: Plan }) {
  const { distance, today } = useFormat();
  const changed = useChanged();
  const { bikeId, name, from, to, distanceM, outlook } = plan;
  const remove = async () => {
    const putBack = () =>
      addPlan({ bikeId, name, from, to, distanceM }).then(() => changed(outlook?.chainId ?? null));
    try {
      await removePlan(plan.id);
      changed(outlook?.chainId ?? null);
      toastDone(`${name} is removed.`, () => void putBack().catch(toastError));
    } catch (error) {
      toastError(error);
    }
  };
  return (
    <Flex as="li" justify="space-between" gap="3" py="4" borderTopWidth="1px" _first={{ borderTopWidth: 0 }}>
      <Box>
        <Link asChild fontWeight="semibold">
          <RouterLink to={`/plans/${plan.id}`}>{name}</RouterLink>
        </Link>
        <Text color="fg.muted">
          {distance(distanceM)}, {spanWords(from, to, today)}
        </Text>
        {outlook ? (
          <>
            <Text mt="2" fontWeight="semibold">
              {adviceWords(outlook, today)}
            </Text>
            <Text>{outlookWords(outlook)}</Text>
          </>
        ) : (
          <Text mt="2" color="fg.muted">
            Too far ahead to say, or no chain is on the bike yet.
          </Text>
        )}
      </Box>
      <IconButton variant="ghost" aria-label={`Remove ${name}`} onClick={() => void remove()}>
        <Trash2 size={18} aria-hidden="true" />
      </IconButton>
    </Flex>
  );
}
