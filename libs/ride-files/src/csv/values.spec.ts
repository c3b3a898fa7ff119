import fc from 'fast-check';
import { parseDay } from './days';
import { metresIn, parseDistance, parseDuration, parseNumber } from './values';

const days = fc
  .date({ min: new Date('1990-01-01'), max: new Date('2089-12-31'), noInvalidDate: true })
  .map((date) => date.toISOString().slice(0, 10));
const thousandths = fc.integer({ min: 0, max: 2_000_000_000 });

/** Writes a number of thousandths as people do: with a decimal mark and, if wanted, marks between thousands. */
function print(value: number, decimal: '.' | ',', grouped: boolean): string {
  const whole = String(Math.floor(value / 1000));
  const mark = decimal === '.' ? ',' : '.';
  const head = grouped ? whole.replace(/\B(?=(\d{3})+$)/g, mark) : whole;
  return `${head}${decimal}${String(value % 1000).padStart(3, '0')}`;
}

it('reads back every number that it could have been written as', () => {
  fc.assert(
    fc.property(
      thousandths,
      fc.constantFrom('.' as const, ',' as const),
      fc.boolean(),
      (value, decimal, grouped) => {
        expect(parseNumber(print(value, decimal, grouped), decimal)).toBeCloseTo(value / 1000, 6);
      },
    ),
  );
});

it('reads back every day in each order', () => {
  fc.assert(
    fc.property(days, fc.constantFrom('-', '/', '.'), (day, mark) => {
      const [year, month, date] = day.split('-');
      expect(parseDay([year, month, date].join(mark), 'dmy')).toBe(day);
      expect(parseDay([date, month, year].join(mark), 'dmy')).toBe(day);
      expect(parseDay([month, date, year].join(mark), 'mdy')).toBe(day);
    }),
  );
});

it('reads back every duration in each notation', () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 7 * 86_400 }), (seconds) => {
      const [h, m, s] = [Math.floor(seconds / 3600), Math.floor(seconds / 60) % 60, seconds % 60];
      expect(
        parseDuration([h, m, s].map((part) => String(part).padStart(2, '0')).join(':'), 'min', '.'),
      ).toBe(seconds);
      expect(parseDuration(`${h}h ${m}m ${s}s`, 'min', '.')).toBe(seconds);
      expect(parseDuration(String(seconds), 's', '.')).toBe(seconds);
    }),
  );
});

it('cancels units: a distance converted to a unit and read in it is the same distance', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 1, max: 2_000_000 }),
      fc.constantFrom('km' as const, 'mi' as const, 'm' as const),
      (metres, unit) => {
        const written = (metres / metresIn[unit]).toFixed(9);
        expect(parseDistance(written, unit, '.')).toBeCloseTo(metres, 3);
        expect(parseDistance(`${written} ${unit}`, 'km', '.')).toBeCloseTo(metres, 3);
      },
    ),
  );
});

it('refuses days that do not exist and words that are no numbers', () => {
  for (const text of ['2025-02-29', '31/04/2025', '2025-13-01', 'yesterday', '', '5/6'])
    expect(parseDay(text, 'dmy')).toBeNull();
  for (const text of ['', 'ten', '1.2.3', '--4', '1,23,456']) expect(parseNumber(text, '.')).toBeNull();
  expect(parseDuration('1:75', 'min', '.')).toBeNull();
});
