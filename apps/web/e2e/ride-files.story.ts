import { join } from 'node:path';
import { expect, signIn, signInOf, test } from './stage';

const fixture = (...path: string[]) => join(__dirname, '../../../libs/ride-files/fixtures', ...path);
const GOOD = ['laps.tcx', 'lunch.gpx', 'rest.gpx.gz', 'sensor.fit', 'batch.zip'];
const BAD = ['breaks-off.gpx', 'picture.png', 'run.fit', 'damaged.zip'];

/** Riders drop what they have: good files are counted once, bad ones say why and harm nothing. */
test('a rider drops many files at once, twice, and matches the columns of a table', async ({ page }) => {
  await signIn(page, signInOf('rider'));
  await page.goto('/import');
  const files = [...GOOD.map((name) => fixture('ok', name)), ...BAD.map((name) => fixture('not-ok', name))];
  const drop = () => page.locator('input[type=file]').setInputFiles(files);
  const card = (name: string) =>
    page
      .getByRole('listitem')
      .filter({ has: page.getByText(name, { exact: true }) })
      .first();

  await drop();
  // Some hold the same ride in another format: it is added by the first of them only.
  for (const name of GOOD)
    await expect(card(name)).toContainText(/rides? (added|already there)/, { timeout: 30_000 });
  for (const name of ['laps.tcx', 'sensor.fit']) await expect(card(name)).toContainText('added');
  await expect(card('breaks-off.gpx')).toContainText(/breaks off|not complete|ends/);
  await expect(card('run.fit')).toContainText(/sport|ride/);
  for (const name of BAD) await expect(card(name)).not.toContainText(/rides? added/);

  await page.reload();
  await drop();
  for (const name of GOOD) await expect(card(name)).toContainText(/already there/, { timeout: 30_000 });
  for (const name of GOOD) await expect(card(name)).not.toContainText(/rides? added/);

  await page.locator('input[type=file]').setInputFiles(fixture('not-ok', 'day-or-month.csv'));
  const table = card('day-or-month.csv');
  await expect(
    table.getByRole('button', { name: 'No ride to add' }).or(table.getByLabel('Dates')),
  ).toBeVisible();
  await table.getByLabel('Dates').selectOption('dmy');
  await expect(table.getByRole('button', { name: /^Add \d+ rides?$/ })).toBeEnabled();
  await table.getByRole('button', { name: 'Leave it out' }).click();
  await expect(page.getByText('day-or-month.csv')).toHaveCount(0);

  await page.locator('input[type=file]').setInputFiles(fixture('ok', 'decimal-comma.csv'));
  await expect(card('decimal-comma.csv')).toContainText('decimals as 12,5');
  await card('decimal-comma.csv')
    .getByRole('button', { name: /^Add \d+ rides?$/ })
    .click();
  await expect(card('decimal-comma.csv')).toContainText(/rides? added/, { timeout: 30_000 });
});

/** 1,940 rides of five years and more, with days in between on which nothing was ridden. */
function longLog(): string {
  const lines = ['date,distance_km'];
  for (let i = 0; lines.length <= 1940; i++) {
    const day = new Date(Date.now() - (2920 - i) * 86_400_000).toISOString().slice(0, 10);
    if (i % 3 !== 2) lines.push(`${day},${(10 + ((i * 7) % 55)).toFixed(1)}`);
  }
  return lines.slice(0, 1941).join('\n');
}

test('a log of 1,940 rides goes in at once, and a second time nothing doubles', async ({ page }) => {
  await signIn(page, { email: 'cassius.cobbledene@quillbeck.example', password: signInOf('rider').password });
  const log = { name: 'years.csv', mimeType: 'text/csv', buffer: Buffer.from(longLog()) };
  for (const outcome of [/[\d,]+ rides added/, /^1,940 rides already there/]) {
    await page.goto('/import');
    await page.locator('input[type=file]').setInputFiles(log);
    await page.getByRole('button', { name: 'Add 1,940 rides' }).click();
    await expect(page.getByText(outcome).first()).toBeVisible({ timeout: 60_000 });
  }
});
