import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { fitRidingModel } from '@halfpitch/estimation';
import { backtestRider } from './backtest-rider';
import { readLogs } from './logs';

const DEFAULTS = join(__dirname, '../../libs/estimation/src/riding/default-model.json');
const USAGE = 'npm run backtest -- --logs DIR (--out FILE.jsonl | --write-defaults)';

/** Forecasts each rider's riding at every origin with a model taught on the other riders only; one JSON line each. */
function main(): void {
  const { values } = parseArgs({
    options: { logs: { type: 'string' }, out: { type: 'string' }, 'write-defaults': { type: 'boolean' } },
  });
  if (!values.logs || (!values.out && !values['write-defaults'])) throw new Error(`Usage: ${USAGE}`);
  const riders = readLogs(values.logs);
  if (values['write-defaults']) {
    writeFileSync(DEFAULTS, `${JSON.stringify(fitRidingModel(riders, null))}\n`);
    console.log(
      `Wrote the defaults learned from ${riders.length} riders (${readFileSync(DEFAULTS).length} bytes).`,
    );
    return;
  }
  const lines = riders.flatMap((rider) => {
    const others = riders.filter((other) => other !== rider);
    const forecasts = backtestRider(rider, fitRidingModel(others, null));
    console.error(`${rider.rider}: ${forecasts.length} forecasts`);
    return forecasts.map((forecast) => JSON.stringify(forecast));
  });
  writeFileSync(values.out!, lines.map((line) => `${line}\n`).join(''));
}

try {
  main();
} catch (error) {
  console.error((error as Error).message);
  process.exitCode = 1;
}
