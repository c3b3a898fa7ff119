import { mkdir, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';

/** Keeps messages as files: the raw message, and a slip with its number, time and envelope. */
export class Folder {
  constructor(dir) {
    this.dir = dir;
  }

  #file(id, kind) {
    return join(this.dir, `${id}.${kind}`);
  }

  async write(slip, raw) {
    await writeFile(this.#file(slip.id, 'eml'), raw);
    await writeFile(this.#file(slip.id, 'json'), JSON.stringify(slip));
  }

  /** Every message with a slip, oldest first: a message without one was being written when we ended. */
  async readAll() {
    await mkdir(this.dir, { recursive: true });
    const slips = (await readdir(this.dir)).filter((name) => name.endsWith('.json')).sort();
    return Promise.all(
      slips.map(async (name) => {
        const slip = JSON.parse(await readFile(join(this.dir, name), 'utf8'));
        return { slip, raw: await readFile(this.#file(slip.id, 'eml')) };
      }),
    );
  }

  async remove(id) {
    await rm(this.#file(id, 'json'), { force: true });
    await rm(this.#file(id, 'eml'), { force: true });
  }
}
