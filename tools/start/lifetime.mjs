import { endRunning } from '../process/run.mjs';

/**
 * How long the product runs: until a signal, the end of npm, or the crash of a part. Parts that started
 * are stopped in the opposite order, once, whatever ended it.
 */
export class Lifetime {
  #stops = [];
  #finish;
  #ending;
  /** True from the moment somebody asked us to stop. */
  asked = false;
  /** Resolves with nothing when asked to stop, with the trouble when a part crashed. */
  over = new Promise((resolve) => (this.#finish = resolve));

  /** Ends on Ctrl-C, termination, a closed terminal, and when the npm that started us is gone. */
  listen() {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => this.#ask());
    for (const stream of [process.stdout, process.stderr]) stream.on('error', () => this.#ask());
    if (!process.env.npm_lifecycle_event) return;
    const npm = process.ppid;
    setInterval(() => process.ppid !== npm && this.#ask(), 300).unref();
  }

  #ask() {
    if (this.asked) return;
    this.asked = true;
    endRunning();
    this.#finish();
  }

  /** Stops work between two stages once we were asked to end. */
  check() {
    if (this.asked) throw new Error('asked to stop');
  }

  add(stop) {
    this.#stops.push(stop);
  }

  crash(trouble) {
    if (!this.#ending) this.#finish(trouble);
  }

  /** Stops every part, the last started first. */
  end() {
    this.#ending ??= (async () => {
      for (const stop of this.#stops.reverse()) await stop();
    })();
    return this.#ending;
  }

  get ending() {
    return this.#ending !== undefined;
  }
}
