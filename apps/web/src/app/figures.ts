import type { DistanceUnit } from '@halfpitch/contracts';

/** The statute mile: 1,609.344 m exactly (international yard and pound agreement, 1959; memory). */
export const METRES_IN: Record<DistanceUnit, number> = { km: 1000, mi: 1609.344 };

const decimals = (most: number, least = 0) =>
  new Intl.NumberFormat('en-GB', { maximumFractionDigits: most, minimumFractionDigits: least });
const [whole, tenths] = [decimals(0), decimals(1)];

/** Metres as '42.5 km' or '1,204 mi': tenths below 100, whole above. */
export function distance(metres: number, unit: DistanceUnit): string {
  const value = metres / METRES_IN[unit];
  return `${(Math.abs(value) < 99.95 ? tenths : whole).format(value)} ${unit}`;
}

/** A share, 1 = all, as '72 %'. */
export const percent = (share: number): string => `${whole.format(share * 100)} %`;

/** A percentage as it is, '0.38 %': elongation and its limits. */
export const elongation = (value: number): string => `${decimals(2, 2).format(value).replace('-', '−')} %`;

/** A chance, 0 to 1, in steps that do not boast: 'under 1 %', '40 %', 'over 99 %'. */
export function chance(value: number): string {
  if (value < 0.01) return 'under 1 %';
  return value > 0.99 ? 'over 99 %' : percent(value);
}
