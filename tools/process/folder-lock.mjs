import { linkSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** When the process started, in kernel ticks: tells a process from a later one with the same number. */
function startTicks(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19];
  } catch {
    return undefined;
  }
}

function holderOf(file) {
  try {
    const [pid, ticks] = readFileSync(file, 'utf8').trim().split(' ');
    return startTicks(pid) === ticks ? Number(pid) : undefined;
  } catch {
    return undefined;
  }
}

/**
 * Claims a folder for this process. A claim left behind by a killed process does not count.
 * @returns {{ release(): void } | { heldBy: number }}
 */
export function claimFolder(dir) {
  const file = join(dir, 'in-use');
  const own = `${file}.${process.pid}`;
  writeFileSync(own, `${process.pid} ${startTicks(process.pid)}\n`);
  try {
    for (;;) {
      try {
        linkSync(own, file);
        return { release: () => rmSync(file, { force: true }) };
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const heldBy = holderOf(file);
      if (heldBy !== undefined) return { heldBy };
      rmSync(file, { force: true });
    }
  } finally {
    rmSync(own, { force: true });
  }
}
