import { daysAgo } from './scene';
import { expect, signIn, signInOf, test } from './stage';

const NAME = `Hills ${Date.now().toString(36)}`;

test('a rider plans a training week, sees whether the chain lasts, and thinks better of it', async ({
  page,
}) => {
  await signIn(page, signInOf('rider'));
  await page.getByRole('main').getByRole('link', { name: 'Grey hub-gear' }).first().click();
  await page.getByRole('link', { name: 'Plan riding' }).click();
  await page.getByLabel('What is planned').fill(NAME);
  await page.getByLabel('Distance').fill('600');
  await page.getByLabel('From').fill(daysAgo(-20));
  await page.getByLabel('To').fill(daysAgo(-16));
  await page.getByRole('button', { name: 'Save the plan' }).click();
  await expect(page.getByText('The last day is before the first.')).toBeVisible();
  await page.getByLabel('From').fill(daysAgo(-10));
  await page.getByRole('button', { name: 'Save the plan' }).click();

  const plan = page.getByRole('listitem').filter({ hasText: NAME });
  await expect(plan).toContainText('600 ');
  // The estimate follows within a second or two, and the page with it.
  await expect(plan).toContainText(/Come in (by|today)/);
  await expect(plan).toContainText('Even a fresh treatment is used up');

  await plan.getByRole('link', { name: NAME }).click();
  await page.getByLabel('Distance').fill('30');
  await page.getByRole('button', { name: 'Save the plan' }).click();
  await expect(plan).toContainText('30 ');
  await expect(plan).not.toContainText('Even a fresh treatment');

  await plan.getByRole('button', { name: `Remove ${NAME}` }).click();
  await expect(plan).toHaveCount(0);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(plan).toHaveCount(1);
});
