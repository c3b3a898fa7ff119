import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, test as base } from '@playwright/test';

interface SignIn {
  role: string;
  email: string;
  password: string;
}

interface Letter {
  id: string;
  subject: string;
  text: string;
  headers: Record<string, string>;
}

const setting = (name: string): string => {
  const value = process.env[name];
  if (!value)
    throw new Error(`${name} is missing: the stories are started by playwright with product.setup.ts.`);
  return value;
};

export const test = base.extend({
  baseURL: async ({}, provide) => provide(setting('STORY_BASE_URL')),
});

/** The demo's sign-in of a role. */
export function signInOf(role: string): SignIn {
  const signIns = JSON.parse(setting('STORY_SIGN_INS')) as SignIn[];
  return signIns.find((signIn) => signIn.role === role)!;
}

export async function signIn(
  page: Page,
  { email, password }: Pick<SignIn, 'email' | 'password'>,
): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).not.toHaveURL(/sign-in/);
}

/** All letters in the mailbox to an address, newest first. */
export async function lettersTo(address: string): Promise<Letter[]> {
  const mailbox = setting('STORY_MAILBOX_URL');
  const list = await fetch(`${mailbox}/api/messages?to=${encodeURIComponent(address)}`);
  const { messages } = (await list.json()) as { messages: { id: string }[] };
  return Promise.all(
    messages.map(async ({ id }) => (await (await fetch(`${mailbox}/api/messages/${id}`)).json()) as Letter),
  );
}

/** The newest letter to an address, once it has come. */
export async function letterTo(address: string): Promise<Letter> {
  await expect.poll(async () => (await lettersTo(address)).length, { timeout: 20_000 }).toBeGreaterThan(0);
  return (await lettersTo(address))[0]!;
}

/** Moves the server's clock on and waits until the night's work is done. */
export async function laterBy(page: Page, days: number): Promise<void> {
  const answer = await page.request.post('/api/test/clock', { data: { days }, timeout: 100_000 });
  expect(answer.ok()).toBe(true);
}

/** No violation of WCAG 2.2 A and AA that axe can find on the page as it stands. */
export async function expectAccessible(page: Page): Promise<void> {
  const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`);
  expect(found, page.url()).toEqual([]);
}

export { expect };
