import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { NumberField } from '../../components/fields/number-field';
import { SelectField } from '../../components/fields/select-field';
import { TextField } from '../../components/fields/text-field';
import { bikeKindWords, brakeFluidWords } from '../../components/trade-words';
import { optionsOf } from '../chains/options';

/** What is known of a bike. */
export function BikeFields() {
  return (
    <>
      <TextField name="name" label="Name" placeholder="The blue one" autoComplete="off" />
      <ChoiceTiles name="kind" label="Kind" options={optionsOf(bikeKindWords)} minTileWidth="6.5rem" />
      <NumberField name="speeds" label="Speeds" help="Sprockets on the back wheel" decimals={0} />
      <SelectField
        name="brakeFluid"
        label="Brake fluid"
        help="DOT fluid and mineral oil never mix: the part’s own marking decides."
        options={optionsOf(brakeFluidWords)}
      />
      <TextField name="notes" label="Notes" lines={3} />
    </>
  );
}
