import { execFileSync } from 'node:child_process';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { Night, nightOf } from './nightly-run';
import { throwAwayDatabase } from './throw-away-database';

const root = join(__dirname, '../..');

const line = (night: Night) =>
  [
    `${night.chains} chains, ${night.rides} rides (loaded in ${night.loadSeconds.toFixed(1)} s):`,
    `night ${night.seconds.toFixed(1)} s wall, ${night.cpuSeconds.toFixed(1)} s CPU of the worker,`,
    `peak ${night.peakMb.toFixed(0)} MB, ${night.estimates} estimates;`,
    `COPY of the rides to nowhere ${night.copySeconds.toFixed(2)} s, ratio ${(night.seconds / night.copySeconds).toFixed(1)}`,
  ].join(' ');

/** The nightly job on generated chains with three years of rides: npm run bench:nightly [-- --chains 1000,10000] */
async function main(): Promise<void> {
  const { values } = parseArgs({
    options: { chains: { type: 'string', default: '1000,10000' }, dist: { type: 'string' } },
  });
  const dist = join(values.dist ?? join(root, 'dist/apps/api'), 'apps/api/src');
  const database = await throwAwayDatabase();
  try {
    const env = { ...process.env, DATABASE_OWNER_URL: database.ownerUrl };
    execFileSync(process.execPath, [join(dist, 'cli/migrate.js')], { env, stdio: 'inherit' });
    const nights: Night[] = [];
    for (const chains of values.chains.split(',').map(Number)) {
      const night = await nightOf(chains, database, dist);
      console.log(line(night));
      nights.push(night);
    }
    const [first, last] = [nights[0], nights.at(-1)];
    if (first && last && first !== last) {
      const ratio = last.seconds / first.seconds / (last.rides / first.rides);
      console.log(
        `From ${first.chains} to ${last.chains} chains: ${ratio.toFixed(2)} times proportional to the rides.`,
      );
    }
  } finally {
    await database.stop();
  }
}

main().catch((error: Error) => {
  console.error(error.message);
  process.exitCode = 1;
});
