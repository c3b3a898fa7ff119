import { reasonWords, windowWords } from '@halfpitch/contracts';
import type { DistanceUnit, DueWindow, Plan, Reason, Regime } from '@halfpitch/contracts';
import { dayOf } from '@halfpitch/estimation';
import type { EstimateDetail } from '../estimates/estimate.entity';

/** One all-day event; `to` is its last day. */
export interface CalendarEvent {
  uid: string;
  from: string;
  to: string;
  summary: string;
  description: string;
  path: string;
  /** When it was last changed, and a number that grows with each change. */
  stamp: Date;
  sequence: number;
}

export interface DueChain {
  id: string;
  label: string;
  bikeName: string;
  regime: Regime;
  madeOn: string;
  madeAt: Date;
  detail: EstimateDetail;
}

const TREATMENT: Record<Regime, string> = {
  'immersion-wax': 'Re-wax',
  'drip-wax': 'Drip wax',
  'wet-oil': 'Clean and oil',
  'dry-oil': 'Clean and oil',
};

/** A longer window would fill a calendar for months: it is told on its most likely day. */
const LONGEST_BAND = 42;

/** The days an event stands on: the window from today on, or its most likely day; null where nothing is in sight. */
function daysOf({ p10, p50, p90 }: DueWindow, today: string): { from: string; to: string } | null {
  if (p10 === null) return null;
  const from = p10 < today ? today : p10;
  if (p90 !== null && p90 <= from) return { from, to: from };
  if (p90 !== null && dayOf(p90) - dayOf(from) < LONGEST_BAND) return { from, to: p90 };
  const likely = p50 === null || p50 < from ? from : p50;
  return { from: likely, to: likely };
}

function dueEvent(
  chain: DueChain,
  kind: Reason['about'],
  today: string,
  unit: DistanceUnit,
): CalendarEvent[] {
  const window = chain.detail[kind];
  const days = window && daysOf(window, today);
  if (!window || !days) return [];
  const what = kind === 'replacement' ? 'Replace the chain' : TREATMENT[chain.regime];
  const why = chain.detail.reasons
    .filter(({ about }) => about === kind)
    .map((reason) => reasonWords(reason, unit));
  return [
    {
      uid: `${chain.id}-${kind}@halfpitch`,
      ...days,
      summary: `${what}: ${chain.label}, ${chain.bikeName}`,
      description: [`Due: ${windowWords(window, today)}.`, ...why].join('\n'),
      path: `/chains/${chain.id}`,
      stamp: chain.madeAt,
      sequence: dayOf(chain.madeOn),
    },
  ];
}

/** When each chain is due for its treatment and for replacement. */
export const dueEvents = (chains: readonly DueChain[], today: string, unit: DistanceUnit): CalendarEvent[] =>
  chains.flatMap((chain) => [
    ...dueEvent(chain, 'lubrication', today, unit),
    ...dueEvent(chain, 'replacement', today, unit),
  ]);

/** Planned riding, and the day to come in on before it where that is advisable. */
export function planEvents(plans: readonly Plan[], stamp: Date, today: string): CalendarEvent[] {
  return plans.flatMap(({ id, name, bikeName, from, to, distanceM, outlook }) => {
    const shared = { path: `/plans/${id}`, stamp, sequence: dayOf(today) };
    const km = `${Math.round(distanceM / 1000)} km`;
    const planned = {
      ...shared,
      uid: `${id}-plan@halfpitch`,
      from,
      to,
      summary: `${name}: ${km}, ${bikeName}`,
    };
    const events: CalendarEvent[] = [{ ...planned, description: 'Planned riding.' }];
    const day = outlook?.comeInBy;
    if (day && day >= today)
      events.push({
        ...shared,
        uid: `${id}-come-in@halfpitch`,
        from: day,
        to: day,
        summary: `Last day to come in before ${name}`,
        description: `${outlook.chainLabel} may not last through it.`,
      });
    return events;
  });
}
