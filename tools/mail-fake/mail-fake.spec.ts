import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { createTransport, type SendMailOptions } from 'nodemailer';

jest.setTimeout(30_000);

interface Summary {
  id: string;
  to: string[];
  subject: string;
}
interface Whole extends Summary {
  text: string;
  html?: string;
  headers: Record<string, string>;
  attachments: { filename: string; size: number; href: string }[];
}

/** The program as `npm start` runs it, spoken to over SMTP and HTTP only. */
async function startMailFake(settings: Record<string, string> = {}) {
  const env = { ...process.env, SMTP_PORT: '0', MAILBOX_PORT: '0', ...settings };
  const child: ChildProcess = spawn(process.execPath, [join(__dirname, 'main.mjs')], {
    env,
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const found: Record<string, string> = {};
  if (!child.stdout) throw new Error('no output to read');
  for await (const line of createInterface(child.stdout)) {
    const [name = '', value = ''] = line.split(/=(.*)/);
    found[name] = value;
    if (found.SMTP_URL && found.MAILBOX_URL) break;
  }
  const smtp = found.SMTP_URL ?? '';
  const web = found.MAILBOX_URL ?? '';
  const stop = () =>
    new Promise<void>((resolve) => {
      child.once('exit', () => resolve());
      child.kill('SIGTERM');
    });
  const get = async <T>(path: string): Promise<T> => (await fetch(`${web}${path}`)).json() as Promise<T>;
  const letters = (query = '') => get<{ messages: Summary[]; total: number }>(`/api/messages${query}`);
  const whole = async (at = 0) => get<Whole>(`/api/messages/${(await letters()).messages[at]?.id}`);
  const behave = (body: object) =>
    fetch(`${web}/api/behaviour`, { method: 'PUT', body: JSON.stringify(body) }).then(({ status }) => status);
  const send = (mail: SendMailOptions) =>
    createTransport(smtp).sendMail({
      from: 'bench@workshop.example',
      subject: 'Due',
      text: 'Plain words',
      ...mail,
    });
  return { web, stop, get, letters, whole, behave, send };
}

type Fake = Awaited<ReturnType<typeof startMailFake>>;

describe('the mail server that delivers nothing', () => {
  let fake: Fake;
  beforeAll(async () => {
    fake = await startMailFake();
  });
  afterAll(() => fake.stop());
  beforeEach(async () => {
    await fetch(`${fake.web}/api/messages`, { method: 'DELETE' });
    await fake.behave({ mode: 'accept' });
  });

  it('keeps text, html, headers and attachments, newest first, by recipient', async () => {
    await fake.send({ to: 'ada@rider.example', subject: 'First' });
    await fake.send({
      to: ['Ada <ada@rider.example>', 'bo@rider.example'],
      subject: 'Second: 11–24 March',
      html: '<p>A <a href="https://workshop.example/book">free day</a></p>',
      headers: { 'List-Unsubscribe': '<https://workshop.example/stop>' },
      attachments: [{ filename: 'sheet.txt', content: 'torque 6 Nm' }],
    });
    await fake.send({ to: 'cy@rider.example', subject: 'Third' });

    const { messages, total } = await fake.letters('?to=ADA@rider.example');
    expect(total).toBe(2);
    expect(messages.map(({ subject }: { subject: string }) => subject)).toEqual([
      'Second: 11–24 March',
      'First',
    ]);

    const whole = await fake.whole(1);
    expect(whole).toMatchObject({
      to: ['ada@rider.example', 'bo@rider.example'],
      html: expect.stringContaining('free day'),
      headers: { 'list-unsubscribe': '<https://workshop.example/stop>' },
      attachments: [{ filename: 'sheet.txt', size: 11 }],
    });
    expect(whole.text.trim()).toBe('Plain words');
    const file = await fetch(`${fake.web}${whole.attachments[0]?.href}`);
    expect(await file.text()).toBe('torque 6 Nm');
    expect(file.headers.get('content-disposition')).toContain("filename*=UTF-8''sheet.txt");
  });

  it('shows a hostile letter without running it or breaking the page', async () => {
    await fake.send({
      to: 'ada@rider.example',
      subject: '<script>x()</script>',
      html: '<script>x()</script><p>hi</p>',
    });
    const list = await (await fetch(fake.web)).text();
    expect(list).toContain('&lt;script&gt;x()&lt;/script&gt;');
    expect(list).not.toContain('<script>');
    const { id } = await fake.whole();
    const letter = await fetch(`${fake.web}/messages/${id}/html`);
    const policy = letter.headers.get('content-security-policy');
    expect(policy).toContain("default-src 'none'");
    expect(policy).toMatch(/sandbox(?!.*allow-scripts)/);
  });

  it('refuses for good, then takes mail in again after the number of times asked', async () => {
    await fake.behave({ mode: 'refuse', times: 1 });
    await expect(fake.send({ to: 'ada@rider.example' })).rejects.toMatchObject({ responseCode: 550 });
    await fake.send({ to: 'ada@rider.example' });
    expect((await fake.letters()).total).toBe(1);
  });

  it('asks to try later until told otherwise', async () => {
    await fake.behave({ mode: 'try-later' });
    await expect(fake.send({ to: 'ada@rider.example' })).rejects.toMatchObject({ responseCode: 451 });
    await expect(fake.send({ to: 'ada@rider.example' })).rejects.toMatchObject({ responseCode: 451 });
    expect((await fake.letters()).total).toBe(0);
  });

  it('answers late but keeps the message', async () => {
    await fake.behave({ mode: 'delay', delayMs: 400, times: 1 });
    const before = Date.now();
    await fake.send({ to: 'ada@rider.example' });
    expect(Date.now() - before).toBeGreaterThanOrEqual(400);
    expect((await fake.letters()).total).toBe(1);
  });

  it('drops the line in the middle of a message and keeps nothing', async () => {
    await fake.behave({ mode: 'drop', times: 1 });
    await expect(fake.send({ to: 'ada@rider.example' })).rejects.toThrow(/closed|reset|ECONNRESET/i);
    expect((await fake.letters()).total).toBe(0);
    expect(await fake.get('/api/behaviour')).toEqual({ mode: 'accept' });
  });

  it('says no to a behaviour it does not know and to other sites', async () => {
    expect(await fake.behave({ mode: 'sulk' })).toBe(400);
    expect(await fake.behave({ mode: 'delay', delayMs: -1 })).toBe(400);
    const headers = { origin: 'https://elsewhere.example' };
    expect((await fetch(`${fake.web}/clear`, { method: 'POST', headers })).status).toBe(403);
  });
});

describe('a mailbox with a folder', () => {
  const dir = mkdtempSync(join(tmpdir(), 'mailbox-'));
  afterAll(() => rmSync(dir, { recursive: true }));

  it('still has its letters after a restart, until they are deleted', async () => {
    const first = await startMailFake({ MAILBOX_DIR: dir });
    await first.send({ to: 'ada@rider.example', subject: 'Kept' });
    await first.stop();

    const second = await startMailFake({ MAILBOX_DIR: dir });
    const { messages } = await second.letters();
    expect(messages).toMatchObject([{ subject: 'Kept', to: ['ada@rider.example'] }]);
    await fetch(`${second.web}/api/messages`, { method: 'DELETE' });
    await second.stop();
    expect(readdirSync(dir)).toEqual([]);
  });

  it('keeps only the newest letters, on disk too', async () => {
    const small = await startMailFake({ MAILBOX_DIR: dir, MAILBOX_MOST: '2' });
    await small.send({ to: 'ada@rider.example', subject: 'One' });
    await small.send({ to: 'ada@rider.example', subject: 'Two' });
    await small.send({ to: 'ada@rider.example', subject: 'Three' });
    const { messages } = await small.letters();
    expect(messages).toMatchObject([{ subject: 'Three' }, { subject: 'Two' }]);
    expect(readdirSync(dir)).toHaveLength(4);
    await small.stop();
  });
});
