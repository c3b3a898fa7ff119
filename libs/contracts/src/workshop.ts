import { z } from 'zod';
import { shortText } from './common';
import { regimes, surfaces } from './trade';

const factor = z.object({
  lube: z.number().min(0.1, 'A factor is at least 0.1.').max(20, 'A factor is at most 20.'),
  wear: z.number().min(0.1, 'A factor is at least 0.1.').max(20, 'A factor is at most 20.'),
});
const limitDays = z.number().int().min(1).max(730).nullable();

/** GET and PUT /api/workshop: what the owner sets. */
export const workshopSettings = z.object({
  name: shortText('the workshop’s name'),
  town: shortText('the town'),
  timeZone: z.string(),
  currency: z.string().length(3),
  factors: z.object({
    surface: z.record(z.enum(surfaces), factor),
    weather: z.record(z.enum(['dry', 'damp', 'wet', 'mud']), factor),
    wetShareByMonth: z.array(z.number().min(0).max(1)).length(12),
  }),
  /** A treatment is redone after so many days at the latest, by regime; null = no calendar limit. */
  calendarLimitDays: z.record(z.enum(regimes), limitDays),
  /** Write to the rider when the chance of falling due within `days` passes `chance`. */
  reminderPolicy: z.object({
    days: z.number().int().min(1).max(60),
    chance: z.number().min(0.05).max(0.95),
    replacement: z.boolean(),
    lubrication: z.boolean(),
  }),
  bench: z.object({
    minutesPerWeek: z.number().int().min(0).max(20000),
    minutesPerTreatment: z.number().int().min(1).max(480),
    minutesPerReplacement: z.number().int().min(1).max(480),
    chainsPerPotLoad: z.number().int().min(1).max(50),
  }),
});
export type WorkshopSettings = z.infer<typeof workshopSettings>;
