import ical, { ICalEventTransparency } from 'ical-generator';
import type { CalendarEvent } from './calendar-events';

const A_DAY_MS = 86_400_000;
const midnight = (day: string) => new Date(`${day}T00:00:00Z`);

/** The events as iCalendar text (RFC 5545); they block no time. */
export function calendarText(name: string, events: readonly CalendarEvent[], publicUrl: string): string {
  const calendar = ical({ name, prodId: { company: 'Halfpitch', product: 'Chains', language: 'EN' } });
  // Hints for how often to look again.
  calendar.ttl(6 * 3600);
  for (const { uid, from, to, summary, description, path, stamp, sequence } of events)
    calendar.createEvent({
      id: uid,
      start: midnight(from),
      end: new Date(midnight(to).getTime() + A_DAY_MS),
      allDay: true,
      summary,
      description: `${description}\n${publicUrl}${path}`,
      url: `${publicUrl}${path}`,
      stamp,
      sequence,
      transparency: ICalEventTransparency.TRANSPARENT,
    });
  return calendar.toString();
}
