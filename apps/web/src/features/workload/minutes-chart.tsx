import type { Workload } from '@halfpitch/contracts';
import {
  Bar,
  CartesianGrid,
  ComposedChart,
  Line,
  ReferenceLine,
  ResponsiveContainer,
  XAxis,
  YAxis,
} from 'recharts';
import { chartColours, chartText } from '../../components/chart-colours';
import { axis, margin, shortDay } from './week-axes';
import { whole } from './week-words';

const still = { isAnimationActive: false } as const;

/** Bench minutes a week as bands, against those there are. */
export default function MinutesChart({ load }: { load: Workload }) {
  const data = load.weeks.map(({ from, benchMinutes }) => ({
    week: shortDay(from),
    minutes: [benchMinutes.p10, benchMinutes.p90],
    middle: benchMinutes.p50,
  }));
  return (
    <ResponsiveContainer width="100%" height="100%">
      <ComposedChart data={data} margin={{ ...margin, top: 24 }} accessibilityLayer={false}>
        <CartesianGrid stroke={chartColours.grid} vertical={false} />
        <XAxis dataKey="week" {...axis} interval="preserveStartEnd" minTickGap={8} />
        <YAxis
          width={52}
          {...axis}
          domain={[
            0,
            (highest: number) => Math.ceil(Math.max(highest, load.minutesPerWeek * 1.1) / 100) * 100,
          ]}
        />
        <Bar
          {...still}
          dataKey="minutes"
          fill={chartColours.band}
          stroke={chartColours.line}
          radius={3}
          maxBarSize={36}
        />
        <Line
          {...still}
          dataKey="middle"
          stroke={chartColours.line}
          strokeDasharray="2 4"
          dot={{ r: 4, fill: chartColours.line, strokeDasharray: '' }}
        />
        <ReferenceLine
          y={load.minutesPerWeek}
          stroke={chartColours.limit}
          strokeWidth={2}
          label={{
            value: `${whole(load.minutesPerWeek)} minutes there are`,
            position: 'insideTopRight',
            dy: -22,
            ...chartText,
            fill: chartColours.ink,
          }}
        />
      </ComposedChart>
    </ResponsiveContainer>
  );
}
