import { METRES_IN } from '../../app/format';
import { useSession } from '../../app/session';
import type { FieldProps } from './field-frame';
import { NumberField } from './number-field';

/** A distance typed in this person's unit, kept in whole metres. */
export function DistanceField({ autoFocus, ...field }: FieldProps & { autoFocus?: boolean }) {
  const { distanceUnit } = useSession().preferences;
  return (
    <NumberField
      {...field}
      autoFocus={autoFocus}
      unit={distanceUnit}
      scale={METRES_IN[distanceUnit]}
      decimals={1}
      whole
    />
  );
}
