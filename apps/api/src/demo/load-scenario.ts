import { dayOf } from '@halfpitch/estimation';
import type { Client } from 'pg';
import type { Rider } from '../riders/rider.entity';
import { copyRows } from './copy-rows';
import { demoPeople } from './demo-people';
import { keptEstimates } from './kept-estimates';
import { keptReminders } from './kept-reminders';
import { Random, seedFor } from './random';
import type { Household } from './records';
import type { Scenario, WorkshopScenario } from './scenario';

export interface LoadOptions {
  /** Lets the demo's people sign in, with this password hash; null = nobody can. */
  passwordHash: string | null;
  /** How many weeks ago estimates were made, the oldest first; the reminders they called for are kept with them. */
  weeksAgo: readonly number[];
  say: (line: string) => void;
}

/** Households written at a time: many rows to a COPY, few in memory. */
const BATCH = 50;

/** In the order in which they refer to each other. */
const TABLES: [table: string, rowsOf: (household: Household) => readonly object[]][] = [
  ['rider', ({ rider }) => [rider]],
  ['bike', ({ bikes }) => bikes],
  ['odometer_reading', ({ odometer }) => odometer],
  ['chain', ({ chains }) => chains],
  ['fitting', ({ fittings }) => fittings],
  ['ride', ({ rides }) => rides],
  ['reading', ({ readings }) => readings],
  ['treatment', ({ treatments }) => treatments],
];

async function writeHouseholds(client: Client, households: readonly Household[]): Promise<void> {
  for (const [table, rowsOf] of TABLES)
    await copyRows(
      client,
      table,
      households.flatMap((household) => [...rowsOf(household)]),
    );
}

/** The estimates of past weeks and the letters that went out. */
async function writePast(
  client: Client,
  { seed, workshop }: WorkshopScenario,
  households: readonly Household[],
  today: string,
  weeksAgo: readonly number[],
): Promise<void> {
  for (const household of households) {
    const random = new Random(seedFor(seed, household.index, dayOf(today)));
    const estimates = keptEstimates(random, household, workshop, today, weeksAgo);
    const { reminders, mails } = keptReminders(random, household, estimates, workshop);
    await copyRows(client, 'estimate', estimates);
    await copyRows(client, 'mail', mails);
    await copyRows(client, 'reminder', reminders);
  }
}

async function loadWorkshop(
  client: Client,
  part: WorkshopScenario,
  today: string,
  { passwordHash, weeksAgo, say }: LoadOptions,
): Promise<void> {
  const { workshop } = part;
  await copyRows(client, 'workshop', [workshop]);
  let batch: Household[] = [];
  const riders: Rider[] = [];
  let rides = 0;
  const flush = async () => {
    await writeHouseholds(client, batch);
    if (weeksAgo.length > 0) await writePast(client, part, batch, today, weeksAgo);
    riders.push(...batch.map(({ rider }) => rider));
    rides += batch.reduce((sum, household) => sum + household.rides.length, 0);
    batch = [];
    say(`${workshop.name}: ${riders.length} riders, ${rides} rides`);
  };
  for (const household of part.households()) {
    batch.push(household);
    if (batch.length === BATCH) await flush();
  }
  if (batch.length > 0) await flush();
  if (passwordHash === null) return;
  const { accounts, members } = demoPeople(part, riders, passwordHash, dayOf(today));
  await copyRows(client, 'account', accounts);
  await copyRows(client, 'member', members);
}

/** Writes a scenario into the database in one transaction, connected as the owner of the tables. */
export async function loadScenario(client: Client, scenario: Scenario, options: LoadOptions): Promise<void> {
  await client.query('begin');
  try {
    for (const part of scenario.workshops) await loadWorkshop(client, part, scenario.today, options);
    await client.query('commit');
  } catch (error) {
    await client.query('rollback');
    throw error;
  }
}
