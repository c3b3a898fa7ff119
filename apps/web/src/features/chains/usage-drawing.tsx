import {
  CartesianGrid,
  Line,
  LineChart,
  ReferenceArea,
  ReferenceLine,
  ResponsiveContainer,
  XAxis,
  YAxis,
} from 'recharts';
import type { DistanceUnit } from '@halfpitch/contracts';
import { METRES_IN } from '../../app/format';
import { chartColours, chartText } from '../../components/chart-colours';
import type { cyclePoints } from './chart-data';

type Points = ReturnType<typeof cyclePoints>;

interface UsageDrawingProps {
  now: Points;
  before: Points[];
  /** How long the treatment lasts, metres. */
  life: { p10: number; p50: number; p90: number };
  unit: DistanceUnit;
}

/** Distance by days since the treatment: this cycle strong, earlier ones faint, the treatment's life as a band. */
export default function UsageDrawing({ now, before, life, unit }: UsageDrawingProps) {
  const metres = METRES_IN[unit];
  const inUnit = (key: 'ridden' | 'counted') => (point: Points[number]) => point[key] / metres;
  const highest = Math.max(life.p90, ...[now, ...before].map((points) => points.at(-1)?.counted ?? 0));
  const top = Math.ceil((highest * 1.05) / metres / 50) * 50;
  return (
    <ResponsiveContainer width="100%" height="100%">
      <LineChart margin={{ top: 12, right: 16, bottom: 4, left: 0 }} accessibilityLayer={false}>
        <CartesianGrid stroke={chartColours.grid} vertical={false} />
        <XAxis
          dataKey="days"
          type="number"
          domain={[0, 'dataMax']}
          allowDuplicatedCategory={false}
          tickFormatter={(days: number) => `${days} d`}
          tick={chartText}
          stroke={chartColours.axis}
          minTickGap={32}
        />
        <YAxis domain={[0, top]} unit={` ${unit}`} width={76} tick={chartText} stroke={chartColours.axis} />
        <ReferenceArea
          y1={life.p10 / metres}
          y2={life.p90 / metres}
          fill={chartColours.turning}
          fillOpacity={0.25}
        />
        <ReferenceLine
          y={life.p50 / metres}
          stroke={chartColours.dry}
          strokeWidth={1.5}
          strokeDasharray="7 4"
        />
        {before.map((points, i) => (
          <Line
            key={i}
            data={points}
            dataKey={inUnit('counted')}
            dot={false}
            stroke={chartColours.axis}
            strokeOpacity={0.55}
            isAnimationActive={false}
          />
        ))}
        <Line
          data={now}
          dataKey={inUnit('ridden')}
          dot={false}
          stroke={chartColours.line}
          strokeWidth={2}
          strokeDasharray="3 4"
          isAnimationActive={false}
        />
        <Line
          data={now}
          dataKey={inUnit('counted')}
          dot={false}
          stroke={chartColours.line}
          strokeWidth={3}
          isAnimationActive={false}
        />
      </LineChart>
    </ResponsiveContainer>
  );
}
