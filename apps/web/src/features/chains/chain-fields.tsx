import type { Regime } from '@halfpitch/contracts';
import { defaultWearLimitPct } from '@halfpitch/estimation';
import { useWatch } from 'react-hook-form';
import { useSession } from '../../app/session';
import type { TileOption } from '../../components/fields/tiles';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { DateField } from '../../components/fields/date-field';
import { NumberField } from '../../components/fields/number-field';
import { TextField } from '../../components/fields/text-field';
import { regimeWords } from '../../components/trade-words';

const hints: Record<Regime, string> = {
  'immersion-wax': 'from the pot',
  'drip-wax': 'from a bottle, dries',
  'wet-oil': 'stays wet',
  'dry-oil': 'dries off',
};
const regimes = (Object.keys(hints) as Regime[]).map((value): TileOption<Regime> => ({
  value,
  label: regimeWords[value],
  hint: hints[value],
}));

/** What is known of a chain. */
export function ChainFields() {
  const { today } = useSession().workshop;
  const speeds = useWatch({ name: 'speeds' }) as number | null;
  const usual = speeds === null || Number.isNaN(speeds) ? undefined : String(defaultWearLimitPct(speeds));
  return (
    <>
      <TextField name="label" label="Label" help="To tell it from others, as on its tag" autoComplete="off" />
      <ChoiceTiles name="regime" label="Lubricated with" options={regimes} minTileWidth="8rem" />
      <NumberField name="speeds" label="Speeds" decimals={0} />
      <NumberField
        name="wearLimitPct"
        label="Replace it at"
        unit="% elongation"
        placeholder={usual}
        help="Left empty, common practice by speeds holds: 0.5 from 11 speeds on, 0.75 for 6 to 10, 1 below. The maker’s figure comes first."
      />
      <DateField name="inServiceOn" label="In service since" help="The day it was new" max={today} />
    </>
  );
}
