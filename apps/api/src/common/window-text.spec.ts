import { windowText } from './window-text';

describe('windowText', () => {
  it.each([
    [{ p10: '2026-03-11', p50: '2026-03-17', p90: '2026-03-24' }, 'likely 11–24 March, most likely 17 March'],
    [
      { p10: '2026-03-28', p50: '2026-04-01', p90: '2026-04-09' },
      'likely 28 March – 9 April, most likely 1 April',
    ],
    [{ p10: '2026-03-11', p50: '2026-03-11', p90: '2026-03-11' }, 'most likely 11 March'],
    [{ p10: '2026-03-11', p50: '2027-03-11', p90: null }, 'likely from 11 March on, most likely 11 March'],
    [{ p10: null, p50: null, p90: null }, 'not within two years'],
  ])('%j is "%s"', (days, text) => {
    expect(windowText(days)).toBe(text);
  });
});
