import { whyNotAgain, whyNotTo } from './reminders.policy';

const subject = { retired: false, remindersOn: true, riderName: 'Rita' };

it('writes to nobody who stopped the letters, and about no chain that is retired', () => {
  expect(whyNotTo('lubrication', subject, undefined)).toBeNull();
  expect(whyNotTo('lubrication', { ...subject, remindersOn: false }, undefined)).toMatch(/Rita has stopped/);
  expect(whyNotTo('replacement', { ...subject, retired: true }, undefined)).toMatch(/retired/);
});

it.each([
  ['waiting', true, false],
  ['sent', false, false],
  ['sent', true, true],
  ['failed', false, false],
  ['failed', true, true],
  ['held', false, true],
  ['closed', false, true],
] as const)('one that is %s, again %s: sent %s', (state, again, sent) => {
  expect(whyNotAgain(state, again) === null).toBe(sent);
});
