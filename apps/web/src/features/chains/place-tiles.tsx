import type { Bike } from '@halfpitch/contracts';
import { useController, useFormContext } from 'react-hook-form';
import { Tiles } from '../../components/fields/tiles';

const BOX = 'box';

/** On which bike the new chain goes, whose speeds it then has, or into the box. */
export function PlaceTiles({ bikes }: { bikes: readonly Bike[] }) {
  const { setValue } = useFormContext();
  const { field, fieldState } = useController({ name: 'bikeId' });
  const put = (place: string) => {
    const bike = bikes.find(({ id }) => id === place);
    field.onChange(bike?.id ?? null);
    if (bike) setValue('speeds', bike.speeds);
  };
  return (
    <Tiles
      name="place"
      label="Where it is"
      options={[
        ...bikes.map(({ id, name }) => ({ value: id, label: name })),
        { value: BOX, label: 'In the box' },
      ]}
      value={(field.value as string | null) ?? BOX}
      onChange={put}
      error={fieldState.error?.message}
      minTileWidth="8rem"
    />
  );
}
