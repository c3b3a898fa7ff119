const WIDTH = 32;

/** One line that tells how far an import is. */
export function barLine({ state, total, added, alreadyThere, refused }) {
  if (total === 0) return state === 'failed' ? '' : 'reading the file …';
  const done = added + alreadyThere + refused;
  const filled = Math.floor((WIDTH * done) / total);
  return `${'█'.repeat(filled)}${'░'.repeat(WIDTH - filled)} ${done} of ${total}`;
}

/** Draws in place on a terminal; elsewhere only the end is written. */
export function progressBar(stream) {
  let last = '';
  return {
    draw(state) {
      const line = barLine(state);
      if (line === last) return;
      last = line;
      if (stream.isTTY) stream.write(`\r\x1b[K  ${line}`);
    },
    end() {
      if (last) stream.write(stream.isTTY ? '\n' : `  ${last}\n`);
    },
  };
}
