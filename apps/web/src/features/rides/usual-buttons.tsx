import { Button, Flex, Heading } from '@chakra-ui/react';
import type { Bike } from '@halfpitch/contracts';
import { Repeat } from 'lucide-react';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { surfaceWords, weatherWords } from '../../components/trade-words';
import { toastError } from '../../components/toaster';
import { useLogRide } from './use-log-ride';
import type { UsualRide } from './usual-rides';

/** A usual ride again, today, with one tap. */
export function UsualButtons({ bikes, usual }: { bikes: readonly Bike[]; usual: readonly UsualRide[] }) {
  const { today, distance } = useFormat();
  const log = useLogRide(bikes);
  const [busy, setBusy] = useState<UsualRide | null>(null);
  const known = usual.filter(({ bikeId }) => bikes.some(({ id }) => id === bikeId));
  if (known.length === 0) return null;
  const repeat = async (ride: UsualRide) => {
    setBusy(ride);
    await log({ ...ride, day: today, movingS: null, notes: '' }).catch(toastError);
    setBusy(null);
  };
  return (
    <section aria-labelledby="usual">
      <Heading as="h2" size="lg" id="usual" mb="3">
        The usual, today
      </Heading>
      <Flex gap="3" wrap="wrap">
        {known.map((ride) => (
          <Button
            key={`${ride.bikeId}-${ride.surface}-${ride.distanceM}`}
            variant="outline"
            height="auto"
            py="2.5"
            whiteSpace="normal"
            textAlign="start"
            disabled={busy !== null}
            loading={busy === ride}
            onClick={() => void repeat(ride)}
          >
            <Repeat size={18} aria-hidden="true" />
            {distance(ride.distanceM)}, {surfaceWords[ride.surface].toLowerCase()}
            {ride.surface !== 'indoor' && `, ${weatherWords[ride.weather].toLowerCase()}`}
            {bikes.length > 1 && `, ${bikes.find(({ id }) => id === ride.bikeId)?.name}`}
          </Button>
        ))}
      </Flex>
    </section>
  );
}
