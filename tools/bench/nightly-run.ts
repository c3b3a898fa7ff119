import { execFile } from 'node:child_process';
import { join } from 'node:path';
import { pipeline } from 'node:stream/promises';
import { Writable } from 'node:stream';
import { promisify } from 'node:util';
import { Client } from 'pg';
import { to as copyTo } from 'pg-copy-streams';
import { loadScenario } from '../../apps/api/src/demo/load-scenario';
import { generateScenario } from '../../apps/api/src/demo/scenario';
import type { ThrowAwayDatabase } from './throw-away-database';

const run = promisify(execFile);

export interface Night {
  chains: number;
  rides: number;
  loadSeconds: number;
  /** The night's work, wall and CPU of the worker. */
  seconds: number;
  cpuSeconds: number;
  /** Largest memory the worker ever had, MB. */
  peakMb: number;
  /** What PostgreSQL needs merely to stream those rides out. */
  copySeconds: number;
  estimates: number;
}

async function timed(work: () => Promise<unknown>): Promise<number> {
  const began = performance.now();
  await work();
  return (performance.now() - began) / 1000;
}

/** COPY of what the night reads of each ride, discarded as it comes. */
const copyToNowhere = (client: Client) =>
  pipeline(
    client.query(
      copyTo('copy (select bike_id, chain_id, day, distance_m, surface, weather from ride) to stdout'),
    ),
    new Writable({ write: (_chunk, _encoding, done) => done() }),
  );

/** Loads so many chains with three years of rides, and works through their night in a process of its own. */
export async function nightOf(
  chains: number,
  { appUrl, ownerUrl }: ThrowAwayDatabase,
  dist: string,
): Promise<Night> {
  const client = new Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query('truncate workshop, account cascade');
    const today = new Date().toISOString().slice(0, 10);
    const size = { riders: Math.round(chains * 0.44), bikes: Math.round((chains * 2) / 3), chains };
    const scenario = generateScenario({ seed: 7, today, workshops: 1, years: 3, ...size });
    const load = { passwordHash: null, weeksAgo: [], say: () => undefined };
    const loadSeconds = await timed(() => loadScenario(client, scenario, load));
    await client.query('vacuum analyze');
    const workshopId = scenario.workshops[0]?.workshop.id ?? '';
    const env = {
      PATH: process.env.PATH,
      ROLE: 'http',
      DATABASE_URL: appUrl,
      PUBLIC_URL: 'http://127.0.0.1:4190',
      SMTP_URL: 'smtp://127.0.0.1:1',
      MAIL_FROM: 'Bench <bench@workshop.example>',
    };
    const copySeconds = await timed(() => copyToNowhere(client));
    const { stdout } = await run(
      process.execPath,
      [join(__dirname, 'nightly-worker.mjs'), dist, workshopId],
      { env },
    );
    const { seconds, cpuSeconds, peakMb } = JSON.parse(stdout) as Pick<
      Night,
      'seconds' | 'cpuSeconds' | 'peakMb'
    >;
    const { rows } = await client.query<{ rides: number; estimates: number }>(
      'select (select count(*)::int from ride) as rides, (select count(*)::int from estimate) as estimates',
    );
    const { rides = 0, estimates = 0 } = rows[0] ?? {};
    return { chains, rides, loadSeconds, seconds, cpuSeconds, peakMb, copySeconds, estimates };
  } finally {
    await client.end();
  }
}
