import { ChildProcess, spawn } from 'node:child_process';
import { join } from 'node:path';
import { createInterface } from 'node:readline';

export interface Letter {
  id: string;
  to: string[];
  subject: string;
  text: string;
  html?: string;
  headers: Record<string, string>;
}

/** The real SMTP fake in a process of its own, as npm start runs it. */
export class MailFake {
  constructor(
    private readonly child: ChildProcess,
    readonly smtpPort: number,
    private readonly web: string,
  ) {}

  /** Every letter to an address, newest first. */
  async lettersTo(address: string): Promise<Letter[]> {
    const { messages } = await this.get<{ messages: { id: string }[] }>(
      `/api/messages?to=${encodeURIComponent(address)}`,
    );
    return Promise.all(messages.map(({ id }) => this.get<Letter>(`/api/messages/${id}`)));
  }

  /** The newest letter to an address, waiting up to ten seconds for it. */
  async letterTo(address: string): Promise<Letter> {
    for (const until = Date.now() + 10_000; Date.now() < until;) {
      const [letter] = await this.lettersTo(address);
      if (letter) return letter;
      await new Promise((resolve) => setTimeout(resolve, 50));
    }
    throw new Error(`No letter came to ${address}.`);
  }

  /** Makes the server refuse, delay or drop. */
  async behave(behaviour: {
    mode: 'accept' | 'refuse' | 'try-later' | 'delay' | 'drop';
    times?: number;
    delayMs?: number;
  }): Promise<void> {
    await fetch(`${this.web}/api/behaviour`, { method: 'PUT', body: JSON.stringify(behaviour) });
  }

  stop(): Promise<void> {
    return new Promise((resolve) => {
      this.child.once('exit', () => resolve());
      this.child.kill('SIGTERM');
    });
  }

  private async get<T>(path: string): Promise<T> {
    return (await (await fetch(this.web + path)).json()) as T;
  }
}

export async function startMailFake(): Promise<MailFake> {
  const env = { ...process.env, SMTP_PORT: '0', MAILBOX_PORT: '0' };
  const child = spawn(process.execPath, [join(__dirname, '../../../../tools/mail-fake/main.mjs')], {
    env,
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const said: Record<string, string> = {};
  for await (const line of createInterface(child.stdout)) {
    const [name = '', value = ''] = line.split(/=(.*)/);
    said[name] = value;
    if (said.SMTP_URL && said.MAILBOX_URL) break;
  }
  return new MailFake(child, Number(new URL(said.SMTP_URL!).port), said.MAILBOX_URL!);
}
