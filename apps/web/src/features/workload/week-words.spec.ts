import { describe, expect, it } from 'vitest';
import type { Workload } from '@halfpitch/contracts';
import { bandWords, benchSummary, fit, weekWords, comingSummary } from './week-words';

const band = (p10: number, p50: number, p90: number) => ({ p10, p50, p90, mean: p50 });
const week = (from: string, to: string, minutes: [number, number, number]): Workload['weeks'][number] => ({
  from,
  to,
  treatments: band(1, 2, 3),
  replacements: band(0, 0, 1),
  benchMinutes: band(...minutes),
  potLoads: band(0, 1, 1),
  chains: [],
});
const today = '2026-03-04';
const quiet = week('2026-03-02', '2026-03-08', [50, 100, 200]);
const full = week('2026-03-09', '2026-03-15', [400, 700, 900]);

describe('the week ahead in words', () => {
  it('writes a band once where its ends are the same', () => {
    expect(bandWords({ p10: 4, p90: 9 })).toBe('4–9');
    expect(bandWords({ p10: 1200, p90: 1200 })).toBe('1,200');
  });

  it('names the present week, and others by their days', () => {
    expect(weekWords(quiet, today)).toBe('This week');
    expect(weekWords(full, today)).toBe('9–15 March');
  });

  it('calls a week too full by its middle, and tight by its upper end', () => {
    expect(fit(full.benchMinutes, 600)).toBe('over');
    expect(fit(full.benchMinutes, 800)).toBe('tight');
    expect(fit(full.benchMinutes, 900)).toBe('fits');
  });

  it('says which week is the heaviest and how many are too full', () => {
    expect(benchSummary({ weeks: [quiet, full], minutesPerWeek: 600 }, today)).toBe(
      'The week 9–15 March is the heaviest: 400–900 minutes of the 600 there are. In 1 week there is most likely more work than time.',
    );
    expect(benchSummary({ weeks: [quiet], minutesPerWeek: 600 }, today)).toContain(
      'No week is likely to be too full.',
    );
    expect(benchSummary({ weeks: [], minutesPerWeek: 600 }, today)).toBe('No work is in sight.');
  });

  it('says when riders come, and what that was learned from', () => {
    expect(comingSummary({ chancePerWeek: 0.427, reminders: 118, cameInThreeWeeks: 109 })).toBe(
      'A rider who is due is counted as coming within a week with a chance of 43 %: of 118 reminders 109 were followed by a treatment within three weeks.',
    );
    expect(comingSummary({ chancePerWeek: 0.5, reminders: 0, cameInThreeWeeks: 0 })).toContain(
      'taught better',
    );
  });
});
