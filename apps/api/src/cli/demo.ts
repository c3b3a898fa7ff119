import 'reflect-metadata';
import { parseArgs } from 'node:util';
import { Client } from 'pg';
import { hashPassword } from '../accounts/secrets';
import { dayIn } from '../common/clock';
import { DEMO_PASSWORD, demoSignIns } from '../demo/demo-people';
import { loadScenario } from '../demo/load-scenario';
import { PLACES } from '../demo/places';
import { DEMO_SIZE, generateScenario } from '../demo/scenario';

/** Estimates of the last quarter beside those about treatments: few, since each one is really made while the demo loads. */
const PAST_WEEKS = [12, 6, 1];

const say = (line: string) => console.log(line);

/** Loads the demo into an empty database, or tells that there is something in it already. */
async function load(): Promise<void> {
  const url = process.env.DATABASE_OWNER_URL;
  if (!url)
    throw new Error('DATABASE_OWNER_URL is missing: the address of the database as the owner of its tables.');
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    const { rows } = await client.query('select from workshop limit 1');
    if (rows.length > 0) return say('The database holds a workshop already: the demo is left as it is.');
    const today = dayIn(PLACES[0].timeZone, new Date());
    const scenario = generateScenario({ ...DEMO_SIZE, today });
    const passwordHash = await hashPassword(DEMO_PASSWORD);
    await loadScenario(client, scenario, { passwordHash, weeksAgo: PAST_WEEKS, say });
    say('Demo loaded.');
  } finally {
    await client.end();
  }
}

/** `--sign-ins` prints who can sign in, as JSON, without touching the database. */
async function main(): Promise<void> {
  const { values } = parseArgs({ options: { 'sign-ins': { type: 'boolean', default: false } } });
  if (values['sign-ins']) say(JSON.stringify(demoSignIns()));
  else await load();
}

main().catch((error: Error) => {
  console.error(`The demo could not be loaded: ${error.message}`);
  process.exitCode = 1;
});
