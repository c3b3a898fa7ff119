import { reasonWords, windowWords } from './words';

describe('windowWords', () => {
  const words = (p10: string | null, p50: string | null, p90: string | null) =>
    windowWords({ p10, p50, p90 }, '2026-03-01');

  it('names the span and the most likely day', () => {
    expect(words('2026-03-11', '2026-03-17', '2026-03-24')).toBe('likely 11–24 March, most likely 17 March');
    expect(words('2026-03-28', '2026-03-30', '2026-04-04')).toBe(
      'likely 28 March – 4 April, most likely 30 March',
    );
    expect(words('2026-12-20', '2027-01-02', '2027-01-20')).toBe(
      'likely 20 December – 20 January 2027, most likely 2 January 2027',
    );
  });

  it('says what has begun, is over, or lies beyond two years', () => {
    expect(words('2026-02-20', '2026-02-27', '2026-03-05')).toBe(
      'likely between now and 5 March, most likely now',
    );
    expect(words('2026-02-01', '2026-02-10', '2026-03-01')).toBe('due now');
    expect(words('2026-03-13', '2026-03-13', '2026-03-13')).toBe('most likely 13 March');
    expect(words('2026-09-01', null, null)).toBe('from 1 September on');
    expect(words(null, null, null)).toBe('not within the next two years');
  });
});

describe('reasonWords', () => {
  it('says what moved the window, by how much and which way', () => {
    const about = 'lubrication';
    expect(reasonWords({ code: 'wet-rides', about, days: -6, data: { rides: 2, km: 74 } })).toBe(
      'Two wet rides (74 km, which count for more) moved it six days earlier.',
    );
    expect(reasonWords({ code: 'riding-less', about, days: 1, data: { km: 10, usual: 40 } })).toBe(
      'Less riding than usual (10 km instead of about 40 km) moved it one day later.',
    );
    expect(reasonWords({ code: 'reading', about: 'replacement', days: 12, data: { readings: 1 } })).toBe(
      'One new chain-checker reading moved it 12 days later.',
    );
    expect(reasonWords({ code: 'wet-rides', about, days: -6, data: { rides: 2, km: 74 } }, 'mi')).toBe(
      'Two wet rides (46 mi, which count for more) moved it six days earlier.',
    );
    expect(reasonWords({ code: 'first-estimate', about, days: 0, data: {} })).toMatch(/first estimate/);
  });
});
