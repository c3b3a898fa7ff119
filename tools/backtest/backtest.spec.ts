import { execFileSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { defaultRidingModel, fitRidingModel, isoDay, LEVELS, RiderLog } from '@halfpitch/estimation';
import { backtestRider, Forecast } from './backtest-rider';
import { readLogs } from './logs';

const ROOT = join(__dirname, '../..');
const FIRST = 18_000;

/** A made-up rider: rides on one day in `every`, less in winter. */
function rider(name: string, every: number, km: number): RiderLog {
  const days = Array.from({ length: 800 }, (_, i) => FIRST + i).filter((day) => (day * 7919) % every === 0);
  const season = (day: number) => 1 + 0.4 * Math.sin((2 * Math.PI * (day - 80)) / 365);
  return { rider: name, rides: days.map((day) => ({ day, km: Math.round(km * season(day)) })) };
}

const riders = [rider('a', 3, 30), rider('b', 4, 45), rider('c', 2, 20)];

describe('npm run backtest', () => {
  const folder = mkdtempSync(join(tmpdir(), 'backtest-'));
  afterAll(() => rmSync(folder, { recursive: true }));

  it('writes one line for each rider, origin and distance, quantiles ordered within the horizon', () => {
    for (const { rider: name, rides } of riders) {
      const lines = rides.map(({ day, km }) => `${isoDay(day)},${km}`);
      writeFileSync(join(folder, `${name}.csv`), ['date,distance_km', ...lines].join('\n'));
    }
    const out = join(folder, 'out.jsonl');
    const tsx = join(ROOT, 'node_modules/.bin/tsx');
    execFileSync(tsx, ['tools/backtest/main.ts', '--logs', folder, '--out', out], {
      cwd: ROOT,
      stdio: 'pipe',
    });
    const lines = readFileSync(out, 'utf8')
      .trim()
      .split('\n')
      .map((line) => JSON.parse(line) as Forecast);
    expect(new Set(lines.map((f) => `${f.rider} ${f.origin} ${f.km}`)).size).toBe(lines.length);
    for (const name of ['a', 'b', 'c']) expect(lines.filter((f) => f.rider === name)).toHaveLength(52);
    for (const { q, km, horizon } of lines) {
      expect(horizon).toBe(km === 300 ? 180 : 540);
      expect(q).toHaveLength(11);
      expect([...q].sort((a, b) => a - b)).toEqual(q);
      expect(q[10]).toBeLessThanOrEqual(horizon);
    }
  }, 180_000);

  it('shows a forecast nothing of the rider after the origin', () => {
    const whole = backtestRider(riders[0]!, defaultRidingModel);
    const cut = { ...riders[0]!, rides: riders[0]!.rides.filter(({ day }) => day < FIRST + 400) };
    const early = backtestRider(cut, defaultRidingModel);
    expect(early.length).toBeGreaterThan(10);
    expect(whole.slice(0, early.length)).toEqual(early);
  });

  it('refuses a log without its columns, in words', () => {
    const other = mkdtempSync(join(tmpdir(), 'backtest-'));
    writeFileSync(join(other, 'x.csv'), 'day,km\n2020-01-01,3');
    expect(() => readLogs(other)).toThrow('x.csv lacks the column date or distance_km.');
    rmSync(other, { recursive: true });
  });
});

const realLogs = join(ROOT, '../shared/ridelogs/logs');

(existsSync(realLogs) ? describe : describe.skip)('on real logs, when they lie beside the checkout', () => {
  it('beats the mean of the last 28 days by three tenths or more on riders it was not taught on', () => {
    const all = readLogs(realLogs);
    const odd = all.filter((_, i) => i % 2 === 1);
    const model = fitRidingModel(odd, null);
    let [n, inside, crps, naive] = [0, 0, 0, 0];
    for (const log of all.filter((_, i) => i % 2 === 0)) {
      const last = Math.max(...log.rides.map(({ day }) => day));
      for (const { origin, km, q, horizon } of backtestRider(log, model).filter((f) => f.km === 300)) {
        const from = Date.parse(origin) / 86_400_000;
        let sum = 0;
        const reached = log.rides
          .filter(({ day }) => day >= from)
          .sort((a, b) => a.day - b.day)
          .find((ride) => (sum += ride.km) >= km);
        if (!reached && last - from < horizon) continue;
        const days = Math.min((reached?.day ?? Infinity) - from + 1, horizon);
        const recent = log.rides.filter(({ day }) => day < from && day >= from - 28);
        const rate = recent.reduce((total, ride) => total + ride.km, 0) / 28;
        n++;
        if (days >= q[1]! && days <= q[9]!) inside++;
        q.forEach((x, l) => (crps += (2 / 11) * (days >= x ? LEVELS[l]! : LEVELS[l]! - 1) * (days - x)));
        naive += Math.abs(Math.min(km / Math.max(rate, 1e-6), horizon) - days);
      }
    }
    expect(n).toBeGreaterThan(200);
    expect(crps / naive).toBeLessThan(0.7);
    expect(inside / n).toBeGreaterThan(0.72);
    expect(inside / n).toBeLessThan(0.94);
  }, 120_000);
});
