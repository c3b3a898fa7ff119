import { describe, expect, it } from 'vitest';
import {
  chance,
  daysBetween,
  distance,
  duration,
  elongation,
  instantWords,
  money,
  percent,
  relativeDay,
} from './format';

describe('distances', () => {
  it('writes tenths below a hundred and whole numbers above, by preference', () => {
    expect(distance(42_530, 'km')).toBe('42.5 km');
    expect(distance(1_234_567, 'km')).toBe('1,235 km');
    expect(distance(99_970, 'km')).toBe('100 km');
    expect(distance(0, 'km')).toBe('0 km');
  });

  // 1 mile = 1,609.344 m exactly (international agreement of 1959; memory).
  it('writes miles', () => {
    expect(distance(1609.344, 'mi')).toBe('1 mi');
    expect(distance(42_195, 'mi')).toBe('26.2 mi');
  });
});

describe('shares and chances', () => {
  it('writes them in per cent', () => {
    expect(percent(0.724)).toBe('72 %');
    expect(elongation(0.5)).toBe('0.50 %');
  });

  it('never boasts of certainty', () => {
    expect(chance(0.002)).toBe('under 1 %');
    expect(chance(0.4)).toBe('40 %');
    expect(chance(0.999)).toBe('over 99 %');
  });
});

describe('days and times', () => {
  it('counts calendar days across the change of the clocks and leap days', () => {
    expect(daysBetween('2026-03-28', '2026-03-30')).toBe(2);
    expect(daysBetween('2028-03-01', '2028-02-28')).toBe(-2);
  });

  it('says how far a day is', () => {
    const from = (day: string) => relativeDay(day, '2026-03-10');
    expect([from('2026-03-10'), from('2026-03-11'), from('2026-03-05')]).toEqual([
      'today',
      'tomorrow',
      '5 days ago',
    ]);
    expect([from('2026-03-25'), from('2026-06-20')]).toEqual(['in 2 weeks', 'in 3 months']);
  });

  it('writes durations, money, and instants in the workshop’s zone', () => {
    expect([duration(2700), duration(7500)]).toEqual(['45 min', '2 h 05 min']);
    expect([money(1250, 'GBP'), money(1250, 'JPY')]).toEqual(['£12.50', 'JP¥1,250']);
    expect(instantWords('2026-07-01T23:30:00Z', 'Europe/Vienna')).toBe('2 July 2026 at 01:30');
  });
});
