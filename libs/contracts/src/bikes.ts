import { z } from 'zod';
import { day, id, metres, notes, pageOf, pageQuery, shortText } from './common';
import { bikeKinds, brakeFluids } from './trade';

export const bikeInput = z.object({
  name: shortText('a name for the bike'),
  kind: z.enum(bikeKinds),
  speeds: z.number().int().min(1, 'At least one speed.').max(14, 'At most 14 speeds.'),
  brakeFluid: z.enum(brakeFluids),
  notes: notes.default(''),
});
export const newBike = bikeInput.extend({ riderId: id });
export const bike = bikeInput.extend({
  id,
  riderId: id,
  riderName: z.string(),
  /** The chain that is on the bike now. */
  fittedChainId: id.nullable(),
});
export type Bike = z.infer<typeof bike>;
export type NewBike = z.infer<typeof newBike>;
export type BikeInput = z.infer<typeof bikeInput>;
export const bikePage = pageOf(bike);
export const bikeQuery = pageQuery.extend({ riderId: id.optional() });
export type BikeQuery = z.infer<typeof bikeQuery>;

/** GET, POST /api/bikes/:id/odometer, DELETE …/odometer/:readingId; given twice for a day, the later figure holds. */
export const odometerInput = z.object({ day, odometerM: metres('The odometer', 200_000) });
export type OdometerInput = z.infer<typeof odometerInput>;
export const odometerReading = odometerInput.extend({ id, bikeId: id });
export type OdometerReading = z.infer<typeof odometerReading>;
export const odometerPage = pageOf(odometerReading);
