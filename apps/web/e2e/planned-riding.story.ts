import { daysAgo } from './scene';
import { expect, signIn, signInOf, test } from './stage';

test('a rider plans a training week, sees whether the chain lasts, and thinks better of it', async ({
  page,
}) => {
  await signIn(page, signInOf('rider'));
  await page.getByRole('main').getByRole('link', { name: 'Grey hub-gear' }).first().click();
  await page.getByRole('link', { name: 'Plan riding' }).click();
  await page.getByLabel('What is planned').fill('A week in the hills');
  await page.getByLabel('Distance').fill('600');
  await page.getByLabel('From').fill(daysAgo(-20));
  await page.getByLabel('To').fill(daysAgo(-21));
  await page.getByRole('button', { name: 'Save the plan' }).click();
  await page.getByLabel('From').fill(daysAgo(-15));
  await page.getByRole('button', { name: 'Save the plan' }).click();

  const plan = page.getByRole('listitem').filter({ hasText: 'A week in the hills' });
  await expect(plan).toContainText('600 km');
  // The estimate follows within a second or two, and the page with it.
  await expect(plan).toContainText('Come in by');
  await expect(plan).toContainText('Even a fresh treatment is used up');

  await plan.getByRole('link', { name: 'A week in the hills' }).click();
  await page.getByLabel('Distance').fill('30');
  await page.getByRole('button', { name: 'Save the plan' }).click();
  await expect(plan).toContainText('30 km');
  await expect(plan).not.toContainText('Even a fresh treatment');

  await plan.getByRole('button', { name: 'Remove A week in the hills' }).click();
  await expect(plan).toHaveCount(0);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(plan).toHaveCount(1);
});
