import ICAL from 'ical.js';
import type { EstimateDetail } from '../estimates/estimate.entity';
import { DueChain, dueEvents, planEvents } from './calendar-events';
import { calendarText } from './calendar-text';

const TODAY = '2026-12-01';
const window = (p10: string | null, p50: string | null, p90: string | null) => ({ p10, p50, p90 });
const chain = (lubrication: unknown, replacement: unknown = window(null, null, null)): DueChain => ({
  id: 'c1',
  label: 'Ferry A; winter, long',
  bikeName: 'Ferry bike',
  regime: 'immersion-wax',
  madeOn: '2026-11-30',
  madeAt: new Date('2026-11-30T03:00:00Z'),
  detail: {
    lubrication,
    replacement,
    reasons: [{ code: 'wet-rides', about: 'lubrication', days: -6, data: { rides: 2, km: 74 } }],
  } as unknown as EstimateDetail,
});
const events = (...chains: DueChain[]) => dueEvents(chains, TODAY, 'km');
const parsed = (text: string) =>
  new ICAL.Component(ICAL.parse(text) as never).getAllSubcomponents('vevent').map((c) => new ICAL.Event(c));

describe('due windows in a calendar', () => {
  it('stand on their days, from today on', () => {
    expect(events(chain(window('2026-12-11', '2026-12-17', '2026-12-24')))).toMatchObject([
      {
        uid: 'c1-lubrication@halfpitch',
        from: '2026-12-11',
        to: '2026-12-24',
        summary: 'Re-wax: Ferry A; winter, long, Ferry bike',
        description:
          'Due: likely 11–24 December, most likely 17 December.\nTwo wet rides (74 km, which count for more) moved it six days earlier.',
      },
    ]);
    expect(events(chain(window('2026-11-20', '2026-11-27', '2026-12-05')))).toMatchObject([
      { from: TODAY, to: '2026-12-05' },
    ]);
    expect(events(chain(window('2026-11-01', '2026-11-10', '2026-11-20')))).toMatchObject([
      { from: TODAY, to: TODAY },
    ]);
  });

  it('stand on the most likely day where the window is long or open', () => {
    const far = events(
      chain(window('2027-01-01', '2027-04-01', '2027-08-01'), window('2027-02-01', '2027-09-01', null)),
    );
    expect(far).toMatchObject([
      { from: '2027-04-01', to: '2027-04-01' },
      { uid: 'c1-replacement@halfpitch', from: '2027-09-01', summary: expect.stringContaining('Replace') },
    ]);
    expect(events(chain(window(null, null, null)), chain(null))).toEqual([]);
  });
});

describe('the calendar’s text', () => {
  const text = calendarText(
    'Chains, Quillbeck Cycle Workshop',
    events(chain(window('2026-12-11', '2026-12-17', '2026-12-24'))),
    'https://halfpitch.example',
  );

  it('is read back by a parser of the standard', () => {
    const [event] = parsed(text);
    expect(event).toMatchObject({ uid: 'c1-lubrication@halfpitch', sequence: 20787 });
    expect(event!.summary).toBe('Re-wax: Ferry A; winter, long, Ferry bike');
    expect(event!.startDate.isDate).toBe(true);
    expect(event!.startDate.toString()).toBe('2026-12-11');
    // DTEND is the day after the last (RFC 5545, 3.6.1, read).
    expect(event!.endDate.toString()).toBe('2026-12-25');
    expect(event!.description).toContain('https://halfpitch.example/chains/c1');
  });

  it('keeps the form of RFC 5545: CRLF, lines of 75 octets, one calendar', () => {
    const lines = text.split('\r\n');
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    for (const line of lines) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
    expect(lines[0]).toBe('BEGIN:VCALENDAR');
    expect(text).toContain('VERSION:2.0');
    expect(text).toContain('TRANSP:TRANSPARENT');
  });
});

it('shows planned riding, and the last day to come in before it', () => {
  const plan = {
    id: 'p1',
    bikeId: 'b1',
    bikeName: 'Ferry bike',
    name: 'A training week',
    from: '2026-12-14',
    to: '2026-12-20',
    distanceM: 600_000,
    outlook: {
      chainId: 'c1',
      chainLabel: 'Ferry A',
      lubrication: { before: 0.1, byEnd: 0.9 },
      replacement: { before: 0, byEnd: 0 },
      treatments: 2,
      comeInBy: '2026-12-13',
    },
  };
  expect(planEvents([plan], new Date(), TODAY)).toMatchObject([
    {
      uid: 'p1-plan@halfpitch',
      from: '2026-12-14',
      to: '2026-12-20',
      summary: 'A training week: 600 km, Ferry bike',
    },
    { uid: 'p1-come-in@halfpitch', from: '2026-12-13', to: '2026-12-13' },
  ]);
  expect(planEvents([{ ...plan, outlook: null }], new Date(), TODAY)).toHaveLength(1);
});
