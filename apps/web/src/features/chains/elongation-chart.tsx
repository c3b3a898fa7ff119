import type { Chain, ChainEstimate } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { lazy } from 'react';
import { elongation } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { ChartFrame } from '../../components/chart-frame';
import { readingsQuery } from '../readings/api/readings';
import { readingWords } from '../readings/reading-words';
import { elongationPoints, intervals, timeOf } from './chart-data';

const Drawing = lazy(() => import('./elongation-drawing'));
/** Readings that are drawn: the newest so many. */
const DRAWN = 200;

/** How far it has lengthened, where it is going, and where it must be replaced. */
export function ElongationChart({ chain, estimate }: { chain: Chain; estimate: ChainEstimate }) {
  const { today, day } = useFormat();
  const { data } = useQuery(readingsQuery(chain.id, 1, DRAWN));
  const readings = data?.items ?? [];
  const { curve, now } = estimate.elongation;
  const points = elongationPoints(curve, readings);
  const highest = Math.max(
    chain.limitPct * 1.3,
    ...points.map(({ band, measured }) => measured ?? band?.[1] ?? 0),
  );
  const top = Math.ceil(highest * 10) / 10;
  const predicted = curve.map((point) => [
    point.day,
    'Predicted',
    elongation(point.p50),
    `${elongation(point.p10)} to ${elongation(point.p90)}`,
  ]);
  const measured = readings.map((reading) => [reading.day, 'Measured', readingWords(reading), '']);
  const rows = [...predicted, ...measured].sort((a, b) => String(a[0]).localeCompare(String(b[0])));
  return (
    <ChartFrame
      title="Elongation"
      summary={`On ${day(today)} about ${elongation(now.p50)} of the ${elongation(chain.limitPct)} allowed. Dots and upright strokes are readings (a stroke is a go/no-go answer), the band is where it lies with a chance of 80 %.`}
      table={{ head: ['Day', 'What', 'Elongation', 'Likely between'], rows }}
      fileName={`elongation ${chain.label}`}
    >
      <Drawing
        points={points}
        strokes={intervals(readings, top)}
        limit={chain.limitPct}
        top={top}
        today={timeOf(today)}
      />
    </ChartFrame>
  );
}
