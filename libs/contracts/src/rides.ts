import { z } from 'zod';
import { day, id, instant, metres, notes, pageOf, pageQuery } from './common';
import { surfaces, weathers } from './trade';

export const rideInput = z.object({
  bikeId: id,
  day,
  distanceM: metres('The distance', 2000).min(1, 'Give a distance of more than nothing.'),
  movingS: z
    .number()
    .int()
    .min(0)
    .max(7 * 86_400)
    .nullable()
    .default(null),
  surface: z.enum(surfaces),
  weather: z.enum(weathers),
  notes: notes.default(''),
});
export type RideInput = z.infer<typeof rideInput>;
/** POST /api/rides may carry an Idempotency-Key header: sent twice, it is kept once. */
export const ride = rideInput.extend({
  id,
  chainId: id.nullable(),
  startedAt: instant.nullable(),
  source: z.enum(['typed', 'csv', 'gpx', 'tcx', 'fit']),
});
export type Ride = z.infer<typeof ride>;
export const ridePage = pageOf(ride);
export const rideQuery = pageQuery.extend({
  bikeId: id.optional(),
  chainId: id.optional(),
  riderId: id.optional(),
  from: day.optional(),
  to: day.optional(),
});
export type RideQuery = z.infer<typeof rideQuery>;

/** GET /api/rides/by-day?chainId=…|bikeId=…: sums for charts, metres by day, of at most three years. */
export const ridingDay = z.object({ day, distanceM: z.number(), lubeM: z.number(), wearM: z.number() });
export type RidingDay = z.infer<typeof ridingDay>;
export const ridingDays = z.object({ from: day, to: day, days: z.array(ridingDay) });
export type RidingDays = z.infer<typeof ridingDays>;
export const ridingDayQuery = z
  .object({ bikeId: id.optional(), chainId: id.optional(), from: day.optional(), to: day.optional() })
  .refine((q) => (q.bikeId === undefined) !== (q.chainId === undefined), {
    message: 'Name either a bike or a chain.',
    path: ['bikeId'],
  });
export type RidingDayQuery = z.infer<typeof ridingDayQuery>;
