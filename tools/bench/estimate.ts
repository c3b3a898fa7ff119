import { defaultFleetModel, estimateChain, forecastRiding } from '@halfpitch/estimation';
import { elongationPosterior } from '../../libs/estimation/src/elongation/posterior';
import { doubtedReadings } from '../../libs/estimation/src/elongation/doubted';
import { narrowing } from '../../libs/estimation/src/elongation/narrowing';
import { elongationCurve } from '../../libs/estimation/src/elongation/curve';
import { atomsOf } from '../../libs/estimation/src/due/km-left';
import { dueCdf, dueWindow } from '../../libs/estimation/src/due/due-distribution';
import { riderLife } from '../../libs/estimation/src/life/rider-life';
import { lifeObservations } from '../../libs/estimation/src/life/treatments';
import { chainUsage } from '../../libs/estimation/src/usage';
import { chainOfThreeYears } from './chain-of-three-years';

const RUNS = 200;
const WARM_UP = 60;

/** Median of what `work` takes of the processor, ms. */
function median(work: () => unknown): number {
  for (let i = 0; i < WARM_UP; i++) work();
  const times = Array.from({ length: RUNS }, () => {
    const start = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(start);
    return (user + system) / 1000;
  });
  return times.sort((a, b) => a - b)[RUNS / 2]!;
}

const fleet = defaultFleetModel();
for (const ridesAYear of [130, 330]) {
  const history = chainOfThreeYears(ridesAYear);
  const { today, limitPct } = history;
  const usage = chainUsage(history, fleet.factors);
  const forecast = forecastRiding(history.bikeRides, today, fleet.riding, history.planned);
  const readings = history.readings.map((r) => ({ ...r, wearKm: usage.wearKmAt(r.day) }));
  const posterior = elongationPosterior(readings, fleet.elongation.rate['immersion-wax'].road);
  const seen = lifeObservations(history, usage);
  const kmLeft = atomsOf((p) => 2000 + 4000 * p);
  const parts = {
    'distance so far': () => chainUsage(history, fleet.factors),
    'riding ahead': () => forecastRiding(history.bikeRides, today, fleet.riding, history.planned),
    elongation: () => elongationPosterior(readings, fleet.elongation.rate['immersion-wax'].road),
    'doubted readings': () => doubtedReadings(readings, posterior),
    'what narrows it': () => narrowing(posterior, usage.wearKm, limitPct),
    'curve for the chart': () => elongationCurve(history, usage, posterior, 4000, forecast, 1.2),
    'life of the treatment': () => riderLife('re-wax', seen, fleet.life),
    'one due window': () => dueWindow(dueCdf(kmLeft, forecast), today, null),
  };
  console.log(`A chain with three years of rides (${3 * ridesAYear}), 12 readings, 40 treatments:`);
  const whole = median(() => estimateChain(history, fleet));
  console.log(`  ${whole.toFixed(2).padStart(6)} ms of CPU to estimate it, median of ${RUNS}; of which`);
  for (const [name, work] of Object.entries(parts))
    console.log(`  ${median(work).toFixed(2).padStart(6)} ms  ${name}`);
}
