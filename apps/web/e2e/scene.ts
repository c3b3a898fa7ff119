import { expect, type Page } from '@playwright/test';

/** YYYY-MM-DD of so many days before today. */
export function daysAgo(days: number): string {
  return new Date(Date.now() - days * 86_400_000).toISOString().slice(0, 10);
}

/** A plain log of `weeks` weeks up to yesterday: two commutes and a longer ride each week. */
export function rideLog(weeks: number): string {
  const lines = ['date,distance_km'];
  for (let day = weeks * 7; day >= 1; day--) {
    const weekday = day % 7;
    if (weekday === 1 || weekday === 3) lines.push(`${daysAgo(day)},22.4`);
    if (weekday === 5) lines.push(`${daysAgo(day)},61.0`);
  }
  return `${lines.join('\n')}\n`;
}

/** Gives the import page a table as a rider would, finds it read well, and waits for its outcome. */
export async function importFile(page: Page, name: string, content: string, outcome: RegExp): Promise<void> {
  await page.goto('/import');
  await page
    .locator('input[type=file]')
    .setInputFiles({ name, mimeType: 'text/csv', buffer: Buffer.from(content) });
  await page.getByRole('button', { name: /^Add [\d,]+ rides?$/ }).click();
  await expect(page.getByText(outcome)).toBeVisible({ timeout: 30_000 });
}

/** Chooses a tile of a group of choices. */
export async function choose(page: Page, group: string | RegExp, choice: string | RegExp): Promise<void> {
  await page.getByRole('group', { name: group }).getByRole('radio', { name: choice }).check({ force: true });
}
