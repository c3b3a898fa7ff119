import { useFormat } from '../../app/use-format';
import type { Bike } from '@halfpitch/contracts';
import { DateField } from '../../components/fields/date-field';
import { DistanceField } from '../../components/fields/distance-field';
import { BikeChoice } from './bike-choice';
import { GroundTiles } from './ground-tiles';
import { Stack } from '@chakra-ui/react';

/** What a ride needs: how far, on what, in which weather; everything else is set already. */
export function RideFields({ bikes, start = false }: { bikes: readonly Bike[]; start?: boolean }) {
  const { today } = useFormat();
  return (
    <>
      <BikeChoice bikes={bikes} />
      <Stack direction={{ base: 'column', sm: 'row' }} gap="5">
        <DistanceField name="distanceM" label="Distance" autoFocus={start} />
        <DateField name="day" label="Day" max={today} />
      </Stack>
      <GroundTiles />
    </>
  );
}
