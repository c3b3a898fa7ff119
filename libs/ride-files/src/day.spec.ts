import fc from 'fast-check';
import { fileTime, localDay } from './day';

const instants = fc.date({ min: new Date('1990-01-01'), max: new Date('2090-01-01'), noInvalidDate: true });
const quarters = fc.integer({ min: -48, max: 56 }).map((quarter) => quarter * 900);

/** An instant as a clock at an offset from UTC writes it. */
function print(time: number, offsetS: number, colon: string): string {
  const wall = new Date(time + offsetS * 1000).toISOString().replace('Z', '');
  const [h, m] = [Math.floor(Math.abs(offsetS) / 3600), (Math.abs(offsetS) / 60) % 60];
  return `${wall}${offsetS < 0 ? '-' : '+'}${String(h).padStart(2, '0')}${colon}${String(m).padStart(2, '0')}`;
}

it('reads back every instant in every zone', () => {
  fc.assert(
    fc.property(instants, quarters, fc.constantFrom(':', ''), (date, offsetS, colon) => {
      expect(fileTime(print(date.getTime(), offsetS, colon))).toEqual({
        time: date.getTime(),
        zoned: true,
        offsetS,
      });
      expect(fileTime(date.toISOString())).toEqual({ time: date.getTime(), zoned: true, offsetS: null });
    }),
  );
});

it('keeps a wall clock without a zone as it stands', () => {
  expect(fileTime('2025-05-03T23:30:00')).toEqual({
    time: Date.parse('2025-05-03T23:30:00Z'),
    zoned: false,
    offsetS: 0,
  });
});

it.each(['', 'noon', '2025-05-03', '2025-13-03T08:00:00Z', '03/05/2025 08:00'])(
  'takes no time from “%s”',
  (text) => {
    expect(fileTime(text)).toBeNull();
  },
);

it('takes the day from the file’s own offset first, then from the zone given, then in UTC', () => {
  const late = Date.parse('2025-05-03T23:30:00Z');
  expect(localDay(late, 3600, 'America/New_York')).toBe('2025-05-04');
  expect(localDay(late, null, 'Europe/Madrid')).toBe('2025-05-04');
  expect(localDay(late, null, 'America/New_York')).toBe('2025-05-03');
  expect(localDay(late, null, undefined)).toBe('2025-05-03');
});
