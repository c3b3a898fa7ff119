import { describe, expect, it } from 'vitest';
import { calendarSpan, dayScale, FROM, monthTicks, TO, weekTicks } from './calendar-line';

const today = '2026-03-02';
const near = { p10: '2026-03-11', p50: '2026-03-17', p90: '2026-03-24', today };

describe('the calendar line', () => {
  it('holds today and the whole band', () => {
    for (const days of [near, { ...near, p10: '2026-01-05' }, { ...near, today: '2026-05-01' }]) {
      const { start, end } = calendarSpan(days);
      expect(start < days.today && start < days.p10).toBe(true);
      expect(end > days.p90 && end > days.today).toBe(true);
    }
  });

  it('holds the booking too', () => {
    expect(calendarSpan({ ...near, appointment: '2026-05-20' }).end > '2026-05-20').toBe(true);
  });

  it('draws something when nothing comes within two years', () => {
    const { start, end } = calendarSpan({ p10: null, p50: null, p90: null, today });
    expect(start < today).toBe(true);
    expect(end > '2028-01-01').toBe(true);
  });

  it('goes evenly from edge to edge', () => {
    const at = dayScale({ start: '2026-03-01', end: '2026-03-31' });
    expect(at('2026-03-01')).toBe(FROM);
    expect(at('2026-03-16')).toBe((FROM + TO) / 2);
    expect(at('2027-01-01')).toBe(TO);
  });

  // 2 March 2026 is a Monday (computed from the Gregorian calendar).
  it('marks Mondays and firsts of the month', () => {
    expect(weekTicks({ start: '2026-03-01', end: '2026-03-20' })).toEqual([
      '2026-03-02',
      '2026-03-09',
      '2026-03-16',
    ]);
    expect(weekTicks({ start: '2026-01-01', end: '2028-01-01' })).toEqual([]);
    expect(monthTicks({ start: '2025-12-15', end: '2026-02-10' })).toEqual([
      { day: '2026-01-01', word: '2026' },
      { day: '2026-02-01', word: 'Feb' },
    ]);
  });

  it('never crowds its month words', () => {
    const words = monthTicks({ start: '2026-01-01', end: '2028-03-01' }).filter(({ word }) => word);
    expect(words.length).toBeLessThanOrEqual(8);
    expect(words.map(({ word }) => word)).toContain('2027');
  });
});
