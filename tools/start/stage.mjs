const seconds = (since) => `${((performance.now() - since) / 1000).toFixed(1)} s`;

/** Prints each stage as one line with its seconds; on a terminal, the line shows progress meanwhile. */
export function createStages({ life, out = process.stdout } = {}) {
  return async function stage(title, work) {
    life?.check();
    const since = performance.now();
    const progress = (note) => {
      if (out.isTTY)
        out.write(`\r\x1b[K${title} … ${note.slice(0, Math.max(10, out.columns - title.length - 5))}`);
    };
    progress('');
    let note;
    try {
      note = await work(progress);
    } catch (error) {
      if (out.isTTY) out.write('\r\x1b[K');
      throw error;
    }
    life?.check();
    out.write(`${out.isTTY ? '\r\x1b[K' : ''}${title}${note ? `: ${note}` : ''} (${seconds(since)})\n`);
  };
}

/** The same without a word, for tests. */
export const silently = async (_title, work) => void (await work(() => undefined));
