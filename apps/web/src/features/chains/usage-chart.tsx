import type { Chain, ChainEstimate, Usage } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { lazy } from 'react';
import { useFormat } from '../../app/use-format';
import { ChartFrame } from '../../components/chart-frame';
import { Loaded } from '../../components/loaded';
import { usageQuery } from './api/usage';
import { cyclePoints, splitCycles } from './chart-data';
import type { Cycle } from './chart-data';

const Drawing = lazy(() => import('./usage-drawing'));
const EARLIER = 5;

interface UsageChartProps {
  chain: Chain;
  estimate: ChainEstimate;
}

function Chart({ chain, estimate, usage }: UsageChartProps & { usage: Usage }) {
  const { unit, distance, day } = useFormat();
  const { now, before } = splitCycles(usage, EARLIER);
  if (!now) return null;
  const rows = [now, ...before].flatMap((cycle: Cycle) =>
    cycle.points.map((point) => [
      point.day,
      cycle.from,
      distance(point.km * 1000),
      distance(point.lubeKm * 1000),
    ]),
  );
  const { p10, p50, p90 } = estimate.treatment.life;
  const life = { p10: p10 * 1000, p50: p50 * 1000, p90: p90 * 1000 };
  const last = now.points.at(-1);
  return (
    <ChartFrame
      title="Distance since the treatment"
      summary={`Since ${day(now.from)} ${distance((last?.km ?? 0) * 1000)} ridden (dotted), which count as ${distance((last?.lubeKm ?? 0) * 1000)} (full line) because rain and rough ground take more. The band is how long the treatment likely lasts; faint lines are earlier cycles.`}
      table={{ head: ['Day', 'Treated on', 'Ridden', 'Counted'], rows }}
      fileName={`distance ${chain.label}`}
    >
      <Drawing now={cyclePoints(now)} before={before.map(cyclePoints)} life={life} unit={unit} />
    </ChartFrame>
  );
}

/** How far the chain ran on its treatment, beside earlier ones. */
export function UsageChart(props: UsageChartProps) {
  const usage = useQuery(usageQuery(props.chain.id));
  return (
    <Loaded query={usage} rows={1} height="20rem">
      {(found) => <Chart {...props} usage={found} />}
    </Loaded>
  );
}
