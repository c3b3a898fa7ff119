import { Folder } from './folder.mjs';
import { readMessage } from './message.mjs';

/** The messages that arrived, the newest `most` of them, in memory and, with `dir`, on disk. */
export class Store {
  #messages = new Map();
  #folder;
  #most;
  #count = 0;

  constructor({ dir, most = 1_000 } = {}) {
    this.#folder = dir ? new Folder(dir) : undefined;
    this.#most = most;
  }

  /** Takes in what an earlier run kept. */
  async open() {
    for (const { slip, raw } of (await this.#folder?.readAll()) ?? []) {
      this.#messages.set(slip.id, await readMessage(slip, raw));
    }
    await this.#trim();
  }

  async add(envelope, raw) {
    const receivedAt = new Date().toISOString();
    const id = `${receivedAt.replace(/\D/g, '')}-${String((this.#count += 1)).padStart(6, '0')}`;
    const slip = { id, receivedAt, envelope };
    const message = await readMessage(slip, raw);
    await this.#folder?.write(slip, raw);
    this.#messages.set(id, message);
    await this.#trim();
  }

  /** Newest first; with `to`, those addressed to that recipient. */
  list({ to } = {}) {
    const wanted = to?.toLowerCase();
    const all = [...this.#messages.values()].reverse();
    return wanted
      ? all.filter((message) => message.to.some((address) => address.toLowerCase() === wanted))
      : all;
  }

  get(id) {
    return this.#messages.get(id);
  }

  async clear() {
    const ids = [...this.#messages.keys()];
    this.#messages.clear();
    await Promise.all(ids.map((id) => this.#folder?.remove(id)));
  }

  async #trim() {
    while (this.#messages.size > this.#most) {
      const [oldest] = this.#messages.keys();
      this.#messages.delete(oldest);
      await this.#folder?.remove(oldest);
    }
  }
}
