import { z } from 'zod';
import { instant } from './common';

/** GET /api/calendar: whether one's calendar address is given out; the address itself is shown once, when made. */
export const calendarFeed = z.object({ madeAt: instant.nullable() });
export type CalendarFeed = z.infer<typeof calendarFeed>;
/** POST /api/calendar: makes the address, or a new one; the one before stops working. */
export const madeCalendarFeed = z.object({ address: z.url(), madeAt: instant });
export type MadeCalendarFeed = z.infer<typeof madeCalendarFeed>;
/** GET /api/calendar/:token.ics: iCalendar (RFC 5545). */
export const calendarText = z.string();
