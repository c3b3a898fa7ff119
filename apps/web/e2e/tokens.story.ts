import { expect, signIn, signInOf, test } from './stage';
import { daysAgo } from './scene';

test.use({ viewport: { width: 390, height: 844 } });

test('a rider makes a token, a script posts a ride twice under one key, and the token is revoked', async ({
  page,
  playwright,
  baseURL,
}) => {
  await signIn(page, signInOf('rider'));
  await page.goto('/account');
  await page.getByRole('link', { name: 'Tokens for scripts' }).click();
  await page.getByLabel('What is it for?').fill('Evening script');
  await page.getByRole('button', { name: 'Make the token' }).click();
  const secret = await page.locator('code').innerText();
  await page.getByRole('button', { name: 'I have copied it' }).click();
  await expect(page.locator('code')).toHaveCount(0);

  const script = await playwright.request.newContext({
    baseURL,
    extraHTTPHeaders: { authorization: `Bearer ${secret}` },
  });
  const bikes = (await (await script.get('/api/bikes')).json()) as { items: { id: string }[] };
  const data = {
    bikeId: bikes.items[0]!.id,
    day: daysAgo(1),
    distanceM: 12_300,
    surface: 'road',
    weather: 'dry',
  };
  const post = () => script.post('/api/rides', { data, headers: { 'idempotency-key': 'evening-1' } });
  const first = (await (await post()).json()) as { id: string };
  expect(((await (await post()).json()) as { id: string }).id).toBe(first.id);

  await page.getByRole('button', { name: 'Revoke Evening script' }).click();
  await page.getByRole('button', { name: 'Revoke it' }).click();
  await expect(page.getByText('You have none.')).toBeVisible();
  expect((await script.get('/api/bikes')).status()).toBe(401);
  await script.dispose();
});
