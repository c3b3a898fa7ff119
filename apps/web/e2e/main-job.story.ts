import { choose, daysAgo, importFile, rideLog } from './scene';
import { expect, laterBy, lettersTo, letterTo, signIn, signInOf, test } from './stage';

/** New at each run, so that the story can be told again to what runs already. */
const NAME = `Wren ${Date.now().toString(36)}`;
const RIDER = `${NAME.toLowerCase().replace(' ', '.')}@tarnwick.example`;

/** From the desk's invitation to the reminder in the rider's inbox, each person in a browser of their own. */
test('a new rider, a re-wax, one reminder, and the owner sees it coming', async ({ browser, baseURL }) => {
  test.setTimeout(420_000);
  const open = async (width = 390, height = 844) =>
    (await browser.newContext({ baseURL, viewport: { width, height }, locale: 'en-GB' })).newPage();

  const desk = await open(1440, 900);
  await signIn(desk, signInOf('desk'));
  await desk.goto('/riders/new');
  await desk.getByLabel('Name').fill(NAME);
  await desk.getByLabel('E-mail').fill(RIDER);
  await desk.getByRole('button', { name: 'Add the rider' }).click();
  await expect(desk.getByRole('heading', { name: NAME })).toBeVisible();
  await desk.getByRole('button', { name: 'Invite', exact: true }).click();
  await expect(desk.getByText(/invitation is on its way/)).toBeVisible();

  const rider = await open();
  const invitation = await letterTo(RIDER);
  await rider.goto(/\/invitation\/[\w-]+/.exec(invitation.text)![0]);
  await rider.getByLabel('Choose a password').fill('halfway up the hill');
  await rider.getByRole('button', { name: 'Accept the invitation' }).click();
  await expect(rider.getByRole('heading', { name: 'My bikes' })).toBeVisible();

  await rider.goto('/bikes/new');
  await rider.getByLabel('Name').fill('Ferry bike');
  await choose(rider, 'Kind', 'Commuter');
  await rider.getByLabel('Speeds').fill('10');
  await rider.getByRole('button', { name: 'Add the bike' }).click();
  await rider.getByLabel('Label').fill('Ferry A');
  await choose(rider, 'Lubricated with', 'Immersion wax');
  await rider.getByLabel('In service since').fill(daysAgo(21));
  await rider.getByRole('button', { name: 'Add the chain' }).click();
  await expect(rider.getByText('Ferry A').first()).toBeVisible();

  await importFile(rider, 'log.csv', rideLog(52), /156 rides added/);
  await importFile(rider, 'log.csv', rideLog(52), /156 rides already there/);

  await rider.goto('/');
  await rider.getByRole('link', { name: 'Ferry A', exact: true }).click();
  await rider.getByRole('link', { name: 'Enter a reading' }).first().click();
  await choose(rider, 'Tool', 'Digital gauge');
  await choose(rider, 'Read in', 'Percent');
  await rider.getByLabel('Place 1').fill('0.21');
  await rider.getByRole('button', { name: 'Save the reading' }).click();
  await expect(rider.getByRole('heading', { name: 'Ferry A' })).toBeVisible();

  const mechanic = await open(820, 1180);
  await signIn(mechanic, signInOf('mechanic'));
  await mechanic.getByPlaceholder('Rider, bike or chain').fill(NAME);
  await expect(mechanic.getByText('1–1 of 1')).toBeVisible();
  await mechanic.getByText(NAME).first().click();
  await choose(mechanic, 'What you do', /^Re-wax/);
  await choose(mechanic, 'How the chain arrived', /^Turning/);
  await mechanic.getByRole('button', { name: 'Record the treatment' }).click();
  await expect(mechanic.getByText('Due again').first()).toBeVisible();

  const reminders = async () =>
    (await lettersTo(RIDER)).filter(({ subject }) => subject.includes('Ferry bike'));
  const before = (await reminders()).length;
  await laterBy(mechanic, 10);
  await rider.goto('/log');
  await rider.getByLabel('Distance').fill('150');
  await choose(rider, 'Weather', 'Wet');
  await rider.getByRole('button', { name: 'Save the ride' }).click();
  await expect.poll(async () => (await reminders()).length, { timeout: 20_000 }).toBe(before + 1);
  await laterBy(mechanic, 1);
  const [reminder] = await reminders();
  expect(await reminders()).toHaveLength(before + 1);
  expect(reminder!.text).toMatch(/likely|due now/);
  expect(reminder!.text).toContain('/chains/');
  expect(reminder!.headers['list-unsubscribe-post']).toBe('List-Unsubscribe=One-Click');

  const owner = await open(1440, 900);
  await signIn(owner, signInOf('owner'));
  await owner.goto('/weeks');
  await expect(owner.getByText(NAME).first()).toBeVisible();
});
