import type { Page } from '@playwright/test';
import { expect, expectAccessible, signIn, signInOf, test } from './stage';

/** Each look takes seconds: every role's main pages in light, and in dark those with the most colour. */
const LOOKS = [
  { role: 'rider', scheme: 'light', paths: ['/', '/log', '/import', '/account'] },
  { role: 'rider', scheme: 'dark', paths: ['/'] },
  { role: 'mechanic', scheme: 'light', paths: ['/bench'] },
  { role: 'desk', scheme: 'light', paths: ['/due'] },
  { role: 'owner', scheme: 'light', paths: ['/workshop', '/accuracy'] },
  { role: 'owner', scheme: 'dark', paths: ['/weeks'] },
] as const;
const SIZES = {
  rider: { width: 390, height: 844 },
  mechanic: { width: 820, height: 1180 },
  desk: { width: 1440, height: 900 },
  owner: { width: 1440, height: 900 },
};

async function look(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(page.getByRole('status', { name: 'Loading' })).toHaveCount(0);
  await expectAccessible(page);
}

async function lookAtChain(page: Page): Promise<void> {
  await page.goto('/');
  await page.getByRole('main').getByRole('link', { name: 'Town C', exact: true }).first().click();
  await expect(page.getByRole('heading', { name: 'Replacement' })).toBeVisible();
  await expect(page.locator('.recharts-surface').first()).toBeVisible();
  await expectAccessible(page);
}

for (const { role, scheme, paths } of LOOKS)
  test.describe(`what the ${role} sees, ${scheme}`, () => {
    test.use({ viewport: SIZES[role], colorScheme: scheme });

    test('has no barrier that can be found', async ({ page }) => {
      await signIn(page, signInOf(role));
      for (const path of paths) await look(page, path);
      if (role === 'rider') await lookAtChain(page);
    });
  });
