import { existsSync, mkdirSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { run } from '../process/run.mjs';
import { prepareBuild } from '../start/prepare.mjs';
import { countsFrom, jestCounts, playwrightCounts } from './counts.mjs';

const one = (code) => ({ passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, skipped: 0 });

/** A check that counts as one: a script of package.json. */
export const check = (script) => async (context) => {
  const { code } = await run('npm', ['run', '--silent', script], { cwd: context.root, log: context.log });
  return one(code);
};

/** The build, in a folder of its own so that a running `npm start` keeps its files. */
export async function build({ root, dist, log }) {
  return { ...one(0), note: await prepareBuild(root, { out: dist, log }) };
}

const patience = { inAllMs: 15 * 60_000, afterReportMs: 30_000 };

/** Says yes once a runner has taken far too long, or has reported and still does not end. */
function impatience(report) {
  const since = Date.now();
  const hasLingered = () =>
    existsSync(report) && Date.now() - statSync(report).mtimeMs > patience.afterReportMs;
  return () => Date.now() - since > patience.inAllMs || hasLingered();
}

async function runner(context, { program, args, env, report, read }) {
  mkdirSync(join(report, '..'), { recursive: true });
  rmSync(report, { force: true });
  const { code } = await run(join(context.root, 'node_modules/.bin', program), args, {
    cwd: context.root,
    log: context.log,
    giveUp: impatience(report),
    env: { ...process.env, NODE_ENV: 'test', FORCE_COLOR: '0', ...env },
  });
  return countsFrom(report, read, code);
}

/** jest on the files whose names end this way, with the throw-away database at hand. */
export const jest = (ending) => (context) => {
  const report = join(context.reports, `jest-${ending}.json`);
  const { app, owner, admin } = context.databaseUrls;
  return runner(context, {
    program: 'jest',
    args: ['--ci', `--testRegex=\\.${ending}\\.ts$`, '--json', `--outputFile=${report}`],
    env: { TEST_DATABASE_URL: app, TEST_DATABASE_OWNER_URL: owner, TEST_DATABASE_ADMIN_URL: admin },
    report,
    read: jestCounts,
  });
};

export function vitest(context) {
  const report = join(context.reports, 'vitest.json');
  const config = ['--config', 'apps/web/vite.config.mts'];
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  return runner(context, {
    program: 'vitest',
    args: ['run', ...config, ...reporters],
    report,
    read: jestCounts,
  });
}

/** Playwright, whose set-up starts the product from the build of this run. */
export function playwright(context) {
  const report = join(context.reports, 'playwright.json');
  return runner(context, {
    program: 'playwright',
    args: ['test', '--config', 'apps/web/e2e/playwright.config.ts', '--reporter=list,json'],
    env: {
      TEST_DIST: context.dist,
      PLAYWRIGHT_JSON_OUTPUT_NAME: report,
      PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: '1',
    },
    report,
    read: playwrightCounts,
  });
}
