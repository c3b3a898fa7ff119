import { z } from 'zod';

/** What a test may ask of the server; `times` says for how many messages, after which it accepts again. */
const wish = z.strictObject({
  mode: z.enum(['accept', 'refuse', 'try-later', 'delay', 'drop']),
  delayMs: z.int().min(0).max(600_000).optional(),
  times: z.int().min(1).optional(),
});

const normal = { mode: 'accept' };

/** How the server treats the messages that come: changed over HTTP, asked once per message. */
export class Behaviour {
  #now = normal;

  get now() {
    return this.#now;
  }

  /** Takes a wish as it came over the wire; returns the complaint when it makes no sense. */
  change(value) {
    const { success, data, error } = wish.safeParse(value);
    if (!success) return z.prettifyError(error);
    this.#now = data;
    return undefined;
  }

  /** The treatment of the next message. */
  next() {
    const { times, ...treatment } = this.#now;
    if (times === 1) this.#now = normal;
    else if (times) this.#now = { ...treatment, times: times - 1 };
    return treatment;
  }
}
