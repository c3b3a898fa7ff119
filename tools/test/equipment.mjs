import { spawnSync } from 'node:child_process';
import { ensurePostgres } from '../postgres/binaries.mjs';
import { installDebianPackages } from '../process/apt.mjs';

const programs = { chromium: 'chromium', pdftotext: 'poppler-utils' };

const isThere = (program) => spawnSync('which', [program]).status === 0;

/** Installs what the browser tests need from Debian: Chromium, and the tool that reads printed sheets. */
async function ensureBrowser(log) {
  const missing = Object.entries(programs).filter(([program]) => !isThere(program));
  if (missing.length > 0)
    await installDebianPackages(
      missing.map(([, name]) => name),
      { log },
    );
}

/** Installs what the stages need and the machine lacks. */
export async function ensureEquipment(stages, log) {
  const needs = new Set(stages.flatMap((stage) => stage.needs ?? []));
  if (needs.has('database') || needs.has('browser')) await ensurePostgres({ log });
  if (needs.has('browser')) await ensureBrowser(log);
}
