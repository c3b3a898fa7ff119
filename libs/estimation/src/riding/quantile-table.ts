import type { DailyLog } from './daily-log';
import { Coefficients, LearnedRiding, TAUGHT_KM } from './model';
import { quantilesAt } from './quantiles';
import { logView } from './view';

/** Distances at which the quantiles are worked out; others are read between them on a log-log scale. */
export const NODES_KM = [10, 50, ...TAUGHT_KM, 3000] as const;
const FIRST_TAUGHT = TAUGHT_KM[0];
const LAST_TAUGHT = TAUGHT_KM[TAUGHT_KM.length - 1]!;
/** Logs shorter than the first are a newcomer's, longer than the second an established rider's; between them both count. */
const NEWCOMER_DAYS = [60, 120] as const;

/** Quantiles at each node, `wider` times as wide on the log scale; rows by node, made to rise with the distance. */
export function quantileTable(log: DailyLog, model: LearnedRiding, wider: number): number[][] {
  const taught = taughtRows(log, model, wider);
  const first = taught[0]!;
  const last = taught[taught.length - 1]!;
  const rows = NODES_KM.map((km) => {
    if (km < FIRST_TAUGHT) return first.map((days) => Math.max(days * (km / FIRST_TAUGHT), 1));
    return taught[TAUGHT_KM.findIndex((x) => x === km)] ?? last.map((days) => days * (km / LAST_TAUGHT));
  });
  for (let i = 1; i < rows.length; i++) rows[i] = rows[i]!.map((days, l) => Math.max(days, rows[i - 1]![l]!));
  return rows;
}

function taughtRows(log: DailyLog, model: LearnedRiding, wider: number): number[][] {
  const o = log.km.length;
  if (o === 0) return model.blank;
  const view = logView(log, o, model.season);
  const [from, to] = NEWCOMER_DAYS;
  const established = Math.min(Math.max((o - from) / (to - from), 0), 1);
  return TAUGHT_KM.map((km) => {
    const features = view(km);
    const by = (c: Coefficients) => quantilesAt({ ...c, spread: c.spread * wider }, features, km);
    if (established === 1) return by(model);
    const newcomer = by(model.newcomer);
    if (established === 0) return newcomer;
    return by(model).map((days, l) => days ** established * newcomer[l]! ** (1 - established));
  });
}
