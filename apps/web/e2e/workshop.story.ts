import { expect, signIn, signInOf, test } from './stage';

/** What the desk and the owner do on a working day, at their own screens. */
test.use({ viewport: { width: 1440, height: 900 } });

test('the desk holds a reminder, lets it go and writes again', async ({ page }) => {
  await signIn(page, signInOf('desk'));
  await page.goto('/due');
  const hold = page.getByRole('button', { name: /^Hold the reminder to/ }).first();
  const rider = (await hold.getAttribute('aria-label'))!.replace('Hold the reminder to ', '');
  await hold.click();
  await expect(page.getByText(`The reminder to ${rider} is held.`)).toBeVisible();
  const release = page.getByRole('button', { name: `Release the reminder to ${rider}` });
  await release.click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Release and send' }).click();
  await expect(release).toBeHidden();

  await page.goto('/reminders');
  await page.getByRole('button', { name: 'Write again' }).first().click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Write again' }).click();
  await expect(page.getByText(/^A reminder to .* is on its way\.$/)).toBeVisible();
});

test('the owner is told what is wrong with a factor, changes it, invites and removes a mechanic', async ({
  page,
}) => {
  await signIn(page, signInOf('owner'));
  await page.goto('/workshop');
  const wet = page.getByLabel('Wet: treatment');
  await wet.fill('-2');
  await page.getByRole('button', { name: 'Save the settings' }).click();
  await expect(page.getByText('A factor is at least 0.1.')).toBeInViewport();
  await wet.fill('2,5');
  await page.getByRole('button', { name: 'Save the settings' }).click();
  await expect(page.getByText('The settings are saved.')).toBeVisible();
  await page.reload();
  await expect(wet).toHaveValue('2.5');

  const name = `Otis Quarrowby ${Date.now().toString(36)}`;
  await page.getByRole('button', { name: 'Invite someone' }).click();
  const form = page
    .locator('form')
    .filter({ has: page.getByRole('button', { name: 'Send the invitation' }) });
  await form.getByLabel('Name').fill(name);
  await form.getByLabel('E-mail').fill(`${name.toLowerCase().replaceAll(' ', '.')}@quillbeck.example`);
  await form.getByRole('button', { name: 'Send the invitation' }).click();
  const member = page.getByRole('listitem').filter({ hasText: name });
  await member.getByRole('button', { name: 'Remove' }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Remove' }).click();
  await expect(page.getByText(`${name} can no longer sign in here.`)).toBeVisible();
  await expect(member).toHaveCount(0);
});
