import { z } from 'zod';
import { id, instant, pageOf, pageQuery } from './common';
import { surfaces, weathers } from './trade';

/** The largest file that POST /api/imports takes. */
export const MAX_IMPORT_BYTES = 20 * 1024 * 1024;
/** How the columns of a CSV are to be read; a form field, so it comes as JSON text. */
const csvColumn = z.number().int().min(0).max(1000).optional();
const csvMatching = z.object({
  delimiter: z.enum([',', ';', '\t', '|']),
  hasHeader: z.boolean(),
  decimal: z.enum(['.', ',']),
  dateOrder: z.enum(['ymd', 'dmy', 'mdy']),
  distanceUnit: z.enum(['km', 'mi', 'm']),
  timeUnit: z.enum(['s', 'min', 'h']),
  shortClock: z.enum(['h:m', 'm:s']),
  columns: z.object({
    date: csvColumn,
    startTime: csvColumn,
    distance: csvColumn,
    movingTime: csvColumn,
    elapsedTime: csvColumn,
    surface: csvColumn,
    weather: csvColumn,
    indoor: csvColumn,
    sport: csvColumn,
  }),
});
const jsonText = z
  .string()
  .max(4000)
  .transform((text, context): unknown => {
    try {
      return JSON.parse(text);
    } catch {
      context.addIssue({ code: 'custom', message: 'The matching of the columns could not be read.' });
      return z.NEVER;
    }
  });

/**
 * POST /api/imports (multipart: file, bikeId or chainId, surface and weather for what the file does not say).
 * A chain stands for the bike it is on.
 */
export const importTarget = z
  .object({
    bikeId: id.optional(),
    chainId: id.optional(),
    surface: z.enum(surfaces).default('road'),
    weather: z.enum(weathers).default('unknown'),
    /** 'take': recordings of another sport, or of none that is named, count as rides too. */
    otherSports: z.enum(['leave', 'take']).default('leave'),
    /** For a CSV whose columns leave a question open. */
    matching: jsonText.pipe(csvMatching).optional(),
  })
  .refine((q) => (q.bikeId === undefined) !== (q.chainId === undefined), {
    message: 'Name either a bike or a chain.',
    path: ['bikeId'],
  });
export type ImportTarget = z.infer<typeof importTarget>;
/** POST /api/imports, and GET /api/imports/:id, polled while it runs. */
export const rideImport = z.object({
  id,
  fileName: z.string(),
  state: z.enum(['waiting', 'running', 'done', 'failed']),
  total: z.number().int(),
  added: z.number().int(),
  alreadyThere: z.number().int(),
  /** Not taken, whatever the reason. */
  refused: z.number().int(),
  /** Of those, recordings of another sport. */
  otherSport: z.number().int(),
  /** What was wrong, line by line (null where the file has no lines), at most the first 50. */
  problems: z.array(z.object({ line: z.number().int().nullable(), message: z.string() })),
  message: z.string(),
  bikeId: id,
  sentAt: instant,
});
export type RideImport = z.infer<typeof rideImport>;
/** GET /api/imports: files sent before, newest first; a rider is shown their own only. */
export const rideImportPage = pageOf(rideImport);
export const rideImportQuery = pageQuery.extend({ riderId: id.optional() });
export type RideImportQuery = z.infer<typeof rideImportQuery>;
