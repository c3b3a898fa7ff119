import type { Bike } from '@halfpitch/contracts';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { SelectField } from '../../components/fields/select-field';

/** So many bikes are shown side by side; more become a list. */
const AS_TILES = 4;

/** Which bike; nothing to choose where there is only one. */
export function BikeChoice({ bikes }: { bikes: readonly Bike[] }) {
  const options = bikes.map(({ id, name }) => ({ value: id, label: name }));
  if (bikes.length === 1) return null;
  if (bikes.length <= AS_TILES)
    return <ChoiceTiles name="bikeId" label="Bike" options={options} minTileWidth="8rem" />;
  return <SelectField name="bikeId" label="Bike" options={options} />;
}
