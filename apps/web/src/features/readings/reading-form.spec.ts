import { describe, expect, it } from 'vitest';
import { fractions } from './fractions';
import type { ReadingForm } from './reading-form';
import { measured, readingForm } from './reading-form';

const form = (over: Partial<ReadingForm>): ReadingForm => ({
  chainId: '0196a2f0-7c1e-7abc-8def-0123456789ab',
  day: '2026-11-30',
  baseline: false,
  notes: '',
  method: 'steel-rule',
  entry: 'inch',
  pitches: 24,
  inches: ['', '', ''],
  places: [null, null, null],
  goes: '',
  stops: '',
  ...over,
});

describe('measured', () => {
  it('turns inch fractions over 12 inches into percent: 1/16 in is 0.521 % (computed)', () => {
    expect(measured(form({ inches: ['0.0625', '', '0'] }))?.values).toEqual([0.521, 0]);
  });

  it('turns millimetres over any number of pitches into percent: 306.3 mm over 24 is 0.492 % (computed)', () => {
    expect(measured(form({ entry: 'mm', places: [306.3, null] }))?.values).toEqual([0.492]);
    expect(measured(form({ entry: 'mm', pitches: 10, places: [127.5] }))?.values).toEqual([0.394]);
  });

  it('keeps a go/no-go answer as the interval it is', () => {
    expect(measured(form({ method: 'drop-in', entry: 'steps', goes: '0.5', stops: '0.75' }))).toEqual({
      values: null,
      lower: 0.5,
      upper: 0.75,
    });
  });

  it('is nothing while nothing or nonsense is entered', () => {
    expect(measured(form({}))).toBeNull();
    expect(measured(form({ entry: 'mm', places: [30] }))).toBeNull();
  });
});

describe('readingForm', () => {
  const complaint = (over: Partial<ReadingForm>) => {
    const { path, message } = readingForm.safeParse(form(over)).error!.issues[0]!;
    return [path.join('.'), message];
  };

  it('puts each complaint at the field it is about', () => {
    expect(complaint({})).toEqual(['inches.0', 'Enter what the tool shows.']);
    expect(complaint({ entry: 'mm', places: [306, 30] })[0]).toBe('places.1');
    expect(complaint({ method: 'digital', entry: 'pct', places: [null, 7] })[0]).toBe('places.1');
    expect(complaint({ method: 'drop-in', entry: 'steps', goes: '0.75', stops: '0.5' })[0]).toBe('stops');
  });

  it('sends what the contract asks for', () => {
    expect(readingForm.parse(form({ method: 'digital', entry: 'pct', places: [0.2, 0.31] }))).toEqual({
      chainId: '0196a2f0-7c1e-7abc-8def-0123456789ab',
      day: '2026-11-30',
      method: 'digital',
      values: [0.2, 0.31],
      lower: null,
      upper: null,
      baseline: false,
      notes: '',
    });
  });
});

describe('fractions', () => {
  it('are written in lowest terms', () => {
    expect(fractions.slice(0, 5).map(({ label }) => label)).toEqual([
      'on the line',
      '1/64 in beyond',
      '1/32 in beyond',
      '3/64 in beyond',
      '1/16 in beyond',
    ]);
  });
});
