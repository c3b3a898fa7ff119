import ICAL from 'ical.js';
import { expect, signIn, signInOf, test } from './stage';

test('a rider takes the due windows into a calendar, and stops it again', async ({ page, request }) => {
  await signIn(page, signInOf('rider'));
  await page.goto('/account');
  await page.getByRole('link', { name: 'In your calendar' }).click();
  await page.getByRole('button', { name: 'Make an address' }).click();
  const shown = page.getByText(/\/api\/calendar\/[\w-]+\.ics$/);
  const address = await shown.innerText();
  const answer = await request.get(address);
  expect(answer.headers()['content-type']).toContain('text/calendar');
  const calendar = new ICAL.Component(ICAL.parse(await answer.text()) as never);
  const events = calendar.getAllSubcomponents('vevent').map((event) => new ICAL.Event(event));
  expect(events.length).toBeGreaterThan(0);
  expect(events.every(({ startDate }) => startDate.isDate)).toBe(true);

  await page.getByRole('button', { name: 'Stop' }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Stop it' }).click();
  await expect(page.getByText('No address is given out.')).toBeVisible();
  expect((await request.get(address)).status()).toBe(404);
});
