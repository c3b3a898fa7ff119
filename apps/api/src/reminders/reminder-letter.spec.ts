import { reminderLetter, ReminderText } from './reminder-letter';

const text: ReminderText = {
  kind: 'lubrication',
  subject: {
    chainId: 'c1',
    label: 'A',
    regime: 'immersion-wax',
    retired: false,
    bikeName: 'Gravel <grey>',
    riderId: 'r1',
    riderName: 'Rita',
    email: 'rita@rider.example',
    stopToken: 'secret',
    remindersOn: true,
    lastTreatmentId: null,
    inServiceOn: '2025-06-01',
  },
  window: {
    p10: '2026-03-11',
    p50: '2026-03-17',
    p90: '2026-03-24',
    chanceNow: 0,
    chanceWithin7: 0.1,
    chanceWithin14: 0.5,
    chanceWithin30: 1,
    decidedBy: 'distance',
  },
  detail: {
    reasons: [
      { code: 'reading', about: 'replacement', days: 40, data: { readings: 1 } },
      { code: 'wet-rides', about: 'lubrication', days: -6, data: { rides: 2, km: 74 } },
    ],
    treatment: {
      kind: 're-wax',
      since: '2026-01-01',
      lubeKmUsed: 281.4,
      life: { p10: 200, p50: 300, p90: 420 },
    },
    elongation: {
      now: { p10: 0.2, p50: 0.31, p90: 0.4 },
      rate: { p10: 0.02, p50: 0.04, p90: 0.06 },
      wearKmLeft: { p10: 1000, p50: 2000, p90: 4000 },
      curve: [],
      doubted: [],
    },
  },
  workshop: { name: 'North Wheel', town: 'Tarnwick' },
  today: '2026-03-01',
  publicUrl: 'https://workshop.example',
};

it('states the window, the reason of its own kind and the ways on, in text and html', () => {
  const letter = reminderLetter(text);
  expect(letter.subject).toBe('Gravel <grey>: the chain is due for a re-wax, likely 11–24 March');
  expect(letter.text).toContain('due for a re-wax: likely 11–24 March, most likely 17 March.');
  expect(letter.text).toContain('Two wet rides (74 km, which count for more) moved it six days earlier.');
  expect(letter.text).not.toContain('reading');
  expect(letter.text).toContain('https://workshop.example/chains/c1');
  expect(letter.html).toContain('href="https://workshop.example/stop/secret"');
  expect(letter.html).not.toContain('<grey>');
});

it('carries the headers of a one-click stop (RFC 8058, section 3.1; from memory)', () => {
  expect(reminderLetter(text).headers).toEqual({
    'List-Unsubscribe': '<https://workshop.example/api/stop/secret>',
    'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
  });
});

it('says so when the window is open already', () => {
  const open = { ...text.window, p10: '2026-02-20', p50: '2026-02-27' };
  const letter = reminderLetter({ ...text, kind: 'replacement', window: open });
  expect(letter.subject).toMatch(/due for replacement, now or soon$/);
  expect(letter.text).toContain('One new chain-checker reading moved it 40 days later.');
});

it('says how far it has come where nothing moved the window', () => {
  const told = (kind: ReminderText['kind']) =>
    reminderLetter({ ...text, kind, detail: { ...text.detail, reasons: [] } }).text;
  expect(told('lubrication')).toContain(
    'About 281 km have been ridden on a treatment that usually lasts 300 km',
  );
  expect(told('replacement')).toContain('It has lengthened by about 0.31 %.');
});
